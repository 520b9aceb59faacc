import { existsSync, readFileSync } from "node:fs";
import { mkdtemp, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, describe, expect, it, vi } from "vitest";
import { run, trajectoryText } from "./simulator";

const FOLDER = join(process.cwd(), "../shared/data/simulator");
const TOLERANCE_MMOL = 2e-3;
const table = (text: string) => text.trim().split("\n").slice(1).map((line) => line.split(",").map(Number));

describe.skipIf(!existsSync(FOLDER))("verify simulator against shared/data/simulator (skipped where it is absent)", () => {
  it("follows the reference trajectory at all 289 rows", () => {
    const found = table(trajectoryText(readFileSync(join(FOLDER, "reference_inputs.csv"), "utf8")));
    const expected = table(readFileSync(join(FOLDER, "reference_trajectory.csv"), "utf8"));
    expect(found.map(([minute]) => minute)).toEqual(expected.map(([minute]) => minute));
    const gaps = expected.map((row, i) => Math.abs(row.at(-1)! - found[i]![1]!));
    expect(Math.max(...gaps)).toBeLessThan(TOLERANCE_MMOL);
  });
});

describe("verify simulator", () => {
  afterEach(() => {
    vi.restoreAllMocks();
    process.exitCode = undefined;
  });

  async function outcome(csv: string | null) {
    const written = { out: "", err: "" };
    vi.spyOn(process.stdout, "write").mockImplementation((text) => ((written.out += String(text)), true));
    vi.spyOn(process.stderr, "write").mockImplementation((text) => ((written.err += String(text)), true));
    const file = join(await mkdtemp(join(tmpdir(), "simulator-")), "inputs.csv");
    if (csv !== null) await writeFile(file, csv);
    await run([file]);
    return { ...written, code: process.exitCode };
  }

  it("prints a header and one row every five minutes of a day", async () => {
    const { out, code } = await outcome("kind,t_min,value,unit\n");
    const lines = out.split("\n");
    expect(lines[0]).toBe("t_min,G_mmol_L");
    expect(lines[1]).toBe("0,6");
    expect(lines).toHaveLength(291);
    expect(code).toBeUndefined();
  });

  it("reads columns in any order, with a mark of byte order and lines of another system", async () => {
    const plain = await outcome("kind,t_min,value,unit\nmeal,60,30,g\nbolus,61.5,1,U\n");
    const other = await outcome('\uFEFF"unit",value,kind,t_min\r\nU,1,bolus,61.5\r\ng, 30 ,meal,60\r\n\r\n');
    expect(other.out).toBe(plain.out);
    expect(Number(plain.out.split("\n")[25]?.split(",")[1])).toBeGreaterThan(6);
  });

  it.each([
    ["kind,t_min,value,unit\nsnack,1,2,g\n", "line 2: kind"],
    ["kind,t_min,value,unit\nmeal,1,2,g\nbolus,1,2,mU\n", "line 3: unit"],
    ["kind,t_min,value,unit\nmeal,-5,2,g\n", "line 2: t_min"],
    ["kind,t_min,value,unit\nmeal,5,,g\n", "line 2: value"],
    ["kind,t_min,value\nmeal,5,3\n", "line 2: unit"],
    [null, "no such file"],
  ])("refuses %j, naming the place", async (csv, message) => {
    const { out, err, code } = await outcome(csv);
    expect(err).toContain(message);
    expect({ out, code }).toEqual({ out: "", code: 1 });
  });
});
