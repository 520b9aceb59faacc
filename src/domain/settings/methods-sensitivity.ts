import { methodTable, type Method } from "./method";

const KING_AND_ARMSTRONG = "King and Armstrong 2007, J Diabetes Sci Technol 1:42";
const PMC5478012 = "PMC5478012";

/**
 * Sensitivity factor in mg/dL for one unit: settings.md 1.6. A larger number means a
 * weaker correction. Published mmol/L forms are the same rules divided by 18.
 */
export const SENSITIVITY_METHODS: ReadonlyArray<Method> = methodTable("sensitivity", [
  ["sensitivity-1800", "1800 / TDD (100 / TDD in mmol/L)", [{ constant: 1800, over: ["totalDailyDose"] }], "adult",
    "ICMR guidelines 2022; PMC10563601; UK pump e-learning; Imperial College pump checklist", "R"],
  ["sensitivity-1960", "1960 / TDD (109 / TDD in mmol/L)", [{ constant: 1960, over: ["totalDailyDose"] }], "adult", "Walsh 2010", "S"],
  ["sensitivity-1700", "1700 / TDD (94 / TDD in mmol/L)", [{ constant: 1700, over: ["totalDailyDose"] }], "adult", "AACE; PMC10563601", "R"],
  ["sensitivity-1724", "1724 / TDD", [{ constant: 1724, over: ["totalDailyDose"] }], "adult", "Davidson 2003", "S"],
  ["sensitivity-1694", "1694 / TDD", [{ constant: 1694, over: ["totalDailyDose"] }], "adult", "Davidson 2008", "S"],
  ["sensitivity-1500", "1500 / TDD (83 / TDD in mmol/L)", [{ constant: 1500, over: ["totalDailyDose"] }], "adult", "King 2010", "S"],
  ["sensitivity-1076-plus-12", "1076 / TDD + 12", [{ constant: 1076, over: ["totalDailyDose"] }, { constant: 12 }], "adult", KING_AND_ARMSTRONG, "A"],
  ["sensitivity-4.44-ratio", "4.44 x carb ratio", [{ constant: 4.44, times: ["carbRatio"] }], "adult", KING_AND_ARMSTRONG, "A"],
  ["sensitivity-4.5-ratio", "4.5 x carb ratio", [{ constant: 4.5, times: ["carbRatio"] }], "adult", "family-practice notebook page", "R"],
  ["sensitivity-1500-regular", "1500 / TDD (83 / TDD in mmol/L)", [{ constant: 1500, over: ["totalDailyDose"] }], "regular-insulin",
    "ICMR guidelines for type 1 diabetes 2022, insulin chapter", "R"],
  ["sensitivity-113-child-morning", "113 / TDD in mmol/L (2034 in mg/dL), mornings, as measured", [{ constant: 2034, over: ["totalDailyDose"] }], "child",
    PMC5478012, "A"],
  ["sensitivity-120-child-day", "120 / TDD in mmol/L (2160 in mg/dL), rest of the day, as measured", [{ constant: 2160, over: ["totalDailyDose"] }], "child",
    PMC5478012, "A"],
]);
