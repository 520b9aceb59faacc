import { describe, expect, it } from "vitest";
import { derivativeOf, fixedLossMmolPerMinute, mealMmol, STATE, STATE_SIZE } from "./model";
import { NOMINAL_PARAMETERS as P } from "./parameters";

function rates(state: Partial<Record<keyof typeof STATE, number>>, insulin = 0, factor = 1) {
  const values = new Float64Array(STATE_SIZE);
  for (const [name, value] of Object.entries(state)) values[STATE[name as keyof typeof STATE]] = value;
  const out = new Float64Array(STATE_SIZE);
  derivativeOf(P)(values, insulin, factor, out);
  return out;
}

describe("mealMmol", () => {
  // By hand: 0.8 * 60 g / 180.16 g/mol = 0.266430 mol.
  it("turns grams into absorbed glucose", () => expect(mealMmol(P, 60)).toBeCloseTo(266.43, 2));
});

describe("fixedLossMmolPerMinute", () => {
  // By hand for 70 kg: brain 0.0097 * 70 = 0.679; kidneys 0.003 * (10 - 9) * 0.16 * 70 = 0.0336.
  it.each([[6, 0.679], [4.5, 0.679], [2.25, 0.3395], [9, 0.679], [10, 0.7126], [0, 0]])(
    "loses at %s mmol/L %s mmol a minute", (glucose, loss) => expect(fixedLossMmolPerMinute(P, glucose)).toBeCloseTo(loss, 10),
  );
});

describe("derivativeOf", () => {
  it("moves a meal through the gut without losing any of it", () => {
    const out = rates({ meal1: 40, meal2: 20 });
    expect(out[STATE.meal1]).toBe(-1);
    expect(out[STATE.meal2]).toBe(0.5);
    expect(out[STATE.blood]! - rates({})[STATE.blood]!).toBeCloseTo(0.5, 12);
  });

  it("moves insulin from skin to blood", () => {
    const out = rates({ depot1: 110, depot2: 55 }, 3);
    expect(out[STATE.depot1]).toBe(1);
    expect(out[STATE.depot2]).toBe(1);
    expect(out[STATE.plasma]).toBeCloseTo(1 / 8.4, 12);
  });

  it("never lets the liver consume glucose", () => {
    const made = (liver: number) => rates({ liver, blood: 67.2 })[STATE.blood]!;
    expect(made(0) - made(1)).toBeCloseTo(0.0161 * 70, 12);
    expect(made(1.5)).toBe(made(1));
  });

  it("scales all three actions by the sensitivity factor and nothing else", () => {
    const [one, two] = [rates({ plasma: 10, blood: 67.2 }, 5, 1), rates({ plasma: 10, blood: 67.2 }, 5, 2)];
    for (const name of Object.keys(STATE) as (keyof typeof STATE)[]) {
      const isAction = ["transport", "disposal", "liver"].includes(name);
      expect(two[STATE[name]], name).toBeCloseTo(one[STATE[name]]! * (isAction ? 2 : 1), 12);
    }
  });

  it("lets the sensor follow the blood", () => {
    expect(rates({ blood: 11.2 * 8, sensor: 6 })[STATE.sensor]).toBeCloseTo(0.073 * 2, 12);
  });
});
