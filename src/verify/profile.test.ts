import { mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { GATE_QUESTIONS } from "@/domain/settings/gate-questions";
import { run } from "./profile";

const GATE = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((question) => [question, false]));
const REFERENCE = {
  weightKg: 80,
  ageYears: 40,
  injectionsTotalDailyDoseUnits: 40,
  hypoProne: false,
  insulinStepUnits: 0.05,
  gate: GATE,
};

describe("verify -- profile", () => {
  let folder = "";
  let out = "";
  let err = "";
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), "profile-"));
  });
  afterAll(() => rm(folder, { recursive: true }));
  beforeEach(() => {
    out = "";
    err = "";
    vi.spyOn(process.stdout, "write").mockImplementation((text) => {
      out += String(text);
      return true;
    });
    vi.spyOn(process.stderr, "write").mockImplementation((text) => {
      err += String(text);
      return true;
    });
  });
  afterEach(() => {
    vi.restoreAllMocks();
    process.exitCode = undefined;
  });

  async function runWith(content: string): Promise<unknown> {
    const file = join(folder, "inputs.json");
    await writeFile(file, content);
    await run([file]);
    return out === "" ? null : JSON.parse(out);
  }

  it("answers the requests in their order", async () => {
    const closed = { ...REFERENCE, gate: { ...GATE, pregnant: true } };
    const answers = await runWith(JSON.stringify([REFERENCE, closed, { ...closed, forReview: true }]));
    expect(answers).toMatchObject([
      {
        gate: { open: true, reasons: [] },
        totalDailyDose: { cautious: 30, standard: 35 },
        profile: { cautious: { basal: [{ startMinute: 0, unitsPerHour: 0.5 }] } },
      },
      { gate: { open: false, reasons: [{ code: "pregnant" }] }, totalDailyDose: { methods: [] }, profile: null },
      { gate: { open: false }, totalDailyDose: { cautious: 30 }, profile: { standard: { durationOfActionMinutes: 240 } } },
    ]);
    expect([err, process.exitCode]).toEqual(["", undefined]);
  });

  it("answers an empty array with an empty array", async () => {
    expect(await runWith("[]")).toEqual([]);
  });

  it.each([
    [[REFERENCE, { ...REFERENCE, weightKg: -1 }], /^request 1: weightKg: /],
    [[{ ...REFERENCE, hypoProne: undefined }], /^request 0: hypoProne: /],
    [[{ ...REFERENCE, gate: { ...GATE, steroids: 2 } }], /^request 0: gate\.steroids: /],
    [REFERENCE, /^an array of requests: /],
  ])("exits 1, names the field and prints nothing else: %#", async (requests, message) => {
    await runWith(JSON.stringify(requests));
    expect(err).toMatch(message);
    expect([out, process.exitCode]).toEqual(["", 1]);
  });

  it("exits 1 for a file that is not JSON, is not there or was not named", async () => {
    await runWith("{");
    expect([err, process.exitCode]).toEqual([expect.stringMatching(/^not JSON/), 1]);
    await run([join(folder, "nowhere.json")]);
    expect(err).toMatch(/nowhere\.json/);
    await run([]);
    expect(err).toMatch(/usage: verify -- profile INPUTS\.json/);
    expect(out).toBe("");
  });
});
