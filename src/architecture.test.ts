import { existsSync, readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative } from "node:path";
import { describe, expect, it } from "vitest";

const SRC = import.meta.dirname;
const ROOT = dirname(SRC);

const files = readdirSync(SRC, { recursive: true, encoding: "utf8" })
  .filter((f) => /\.tsx?$/.test(f) && !/\.(test|d)\.tsx?$/.test(f))
  .map((f) => ({ path: relative(SRC, join(SRC, f)).replaceAll("\\", "/"), text: readFileSync(join(SRC, f), "utf8") }));

const IMPORT = /^(?:import|export)\s[^;]*?from\s+"([^"]+)"|^import\s+"([^"]+)"|import\(\s*"([^"]+)"\)/gm;
const importsOf = (text: string) => [...text.matchAll(IMPORT)].map(([, from, bare, dynamic]) => from ?? bare ?? dynamic ?? "");

/** What each room may import. The order is domain, db, lib, features, app; arrows point left. */
const MAY_IMPORT: Record<string, RegExp> = {
  domain: /^(@\/domain\/|\.|zod$|@stdlib\/|@js-temporal\/polyfill$|csv-parse|csv-stringify)/,
  db: /^(?!@\/(lib|components|features|app|testing)\/)(?!next|react)/,
  lib: /^(?!@\/(components|features|app|testing)\/)/,
  components: /^(?!@\/(db|lib|features|app|testing)\/)/,
  features: /^(?!@\/(app|testing)\/)(?!drizzle-orm)/,
};

const ROOM_FILES = /^(schema|actions|constants)\.ts$|^(use-cases|queries|components|emails)\//;
const ROOMS = ["account", "onboarding", "settings", "glucose", "days", "comparison", "circle", "review", "digest", "exchange", "administration"];
const MAY_STAND_AT_TOP = new Set([
  "src", "drizzle", "public", "e2e", "drizzle.config.ts", "next.config.ts", "postcss.config.mjs", "tailwind.config.ts",
  "package.json", "package-lock.json", "README.md", "DEVELOPERS.md", "tsconfig.json", "eslint.config.mjs", "vitest.config.ts",
  "playwright.config.ts", ".env.example", ".gitignore", ".ci", ".git", ".npmrc",
]);

describe("architecture", () => {
  it.each(files)("$path imports only what its room allows", ({ path, text }) => {
    const [room = ""] = path.split("/");
    for (const specifier of importsOf(text)) {
      if (MAY_IMPORT[room]) expect(specifier).toMatch(MAY_IMPORT[room]);
      const [, here] = path.match(/^features\/([^/]+)\//) ?? [];
      const [, there] = specifier.match(/^@\/features\/([^/]+)/) ?? [];
      if (here && there) expect(there, "a feature does not import another").toBe(here);
    }
  });

  it.each(files.filter((f) => /^features\/[^/]+\/(use-cases|queries)\//.test(f.path)))(
    "$path authorises before it touches the database",
    ({ text }) => {
      const authorised = text.search(/authorize\((ctx|job)\.actor/);
      expect(authorised).toBeGreaterThan(-1);
      const touched = text.indexOf("ctx.db");
      if (touched !== -1) expect(authorised).toBeLessThan(touched);
    },
  );

  it.each(files.filter((f) => f.path.startsWith("features/")))("$path is in the vocabulary", ({ path }) => {
    const [, room = "", ...rest] = path.split("/");
    expect(ROOMS).toContain(room);
    expect(rest.join("/")).toMatch(ROOM_FILES);
  });

  it.each(files.filter((f) => f.path.startsWith("domain/")))("$path reads no clock and no dice", ({ text }) => {
    expect(text).not.toMatch(/Date\.now\(|new Date\(\)|Math\.random\(/);
  });

  it.each(files)("$path fits on the desk (400 lines)", ({ text }) => {
    expect(text.split("\n").length).toBeLessThanOrEqual(400);
  });

  it.each(files)("$path has a name of its own: no barrel, no drawer for everything", ({ path }) => {
    expect(path).not.toMatch(/(^|\/)(index\.tsx?|utils?|helpers?|services?|misc|common)(\/|\.|$)/);
  });

  it.each(files.filter((f) => !/^(env\.ts|proxy\.ts|instrumentation\.ts|testing\/)/.test(f.path)))(
    "$path leaves the environment to env.ts",
    ({ text }) => expect(text).not.toMatch(/process\.env/),
  );

  it.each(files.filter((f) => !/^(db|testing|lib\/session\.ts|bench|faults)/.test(f.path)))(
    "$path leaves statements to the repositories",
    ({ text }) => expect(text).not.toMatch(/from "drizzle-orm/),
  );

  it("keeps files small: median at most 70 lines, nine in ten at most 200", () => {
    const lengths = files.map(({ text }) => text.split("\n").length).sort((a, b) => a - b);
    expect(lengths[Math.floor(lengths.length / 2)]).toBeLessThanOrEqual(70);
    expect(lengths[Math.floor(lengths.length * 0.9)]).toBeLessThanOrEqual(200);
  });

  it("has no circle of imports", () => {
    expect(circleOf(new Map(files.map(({ path, text }) => [path, importsOf(text).flatMap((s) => resolve(path, s))])))).toEqual([]);
  });

  it("keeps the top of the tree to what was agreed", () => {
    const ignored = readFileSync(join(ROOT, ".gitignore"), "utf8").split("\n").map((line) => line.replace(/\/$/, ""));
    const strays = readdirSync(ROOT).filter((name) => !MAY_STAND_AT_TOP.has(name) && !ignored.some((line) => line === name || (line.startsWith("*") && name.endsWith(line.slice(1)))));
    expect(strays).toEqual([]);
  });
});

function resolve(from: string, specifier: string): string[] {
  const base = specifier.startsWith("@/") ? specifier.slice(2) : specifier.startsWith(".") ? join(dirname(from), specifier) : null;
  if (base === null) return [];
  return [base, `${base}.ts`, `${base}.tsx`].filter((p) => /\.tsx?$/.test(p) && existsSync(join(SRC, p)));
}

/** The first circle met by a walk in depth, as the list of its files; empty when there is none. */
function circleOf(graph: Map<string, string[]>): string[] {
  const done = new Set<string>();
  const path: string[] = [];
  const visit = (file: string): string[] => {
    if (path.includes(file)) return [...path.slice(path.indexOf(file)), file];
    if (done.has(file)) return [];
    path.push(file);
    for (const next of graph.get(file) ?? []) {
      const circle = visit(next);
      if (circle.length > 0) return circle;
    }
    path.pop();
    done.add(file);
    return [];
  };
  for (const file of graph.keys()) {
    const circle = visit(file);
    if (circle.length > 0) return circle;
  }
  return [];
}
