import { methodTable, type Method } from "./method";

const KURODA_2012_DIABETES = "Kuroda 2012, Diabetes Technol Ther 14:1077";
const KING_ADA_2019 = "King, ADA 2019, abstract 1108-P";
const KING_2012_DIABETES = "King 2012, Diabetes Technol Ther, dia.2012.0104";
const PMC5478012 = "PMC5478012";
const ISPAD_2018_AND = "ISPAD 2018 and 2022";
const ISPAD = "ISPAD";

/**
 * Carb ratio in grams for one unit: settings.md 1.5. A larger number means less
 * insulin for a meal. The three figures of 201 children whose original was not seen
 * are left out on purpose.
 */
export const CARB_RATIO_METHODS: ReadonlyArray<Method> = methodTable("carbRatio", [
  ["ratio-500", "500 / TDD", [{ constant: 500, over: ["totalDailyDose"] }], "adult",
    "ICMR guidelines 2022; PMC10563601; Royal Children's Hospital Melbourne", "R"],
  ["ratio-450", "450 / TDD", [{ constant: 450, over: ["totalDailyDose"] }], "adult", "PMC10563601, table 3", "R"],
  ["ratio-400", "400 / TDD", [{ constant: 400, over: ["totalDailyDose"] }], "adult", "UK pump e-learning, insulin to carbohydrate ratio", "R"],
  ["ratio-441", "441 / TDD", [{ constant: 441, over: ["totalDailyDose"] }], "adult", "Davidson 2008", "S"],
  ["ratio-300-breakfast", "300 / TDD at breakfast", [{ constant: 300, over: ["totalDailyDose"] }], "adult", KURODA_2012_DIABETES, "S"],
  ["ratio-400-lunch-dinner", "400 / TDD at lunch and dinner", [{ constant: 400, over: ["totalDailyDose"] }], "adult", KURODA_2012_DIABETES, "S"],
  ["ratio-314", "314 / TDD", [{ constant: 314, over: ["totalDailyDose"] }], "adult", KING_ADA_2019, "A"],
  ["ratio-106-basal", "106 / basal of a day", [{ constant: 106, over: ["basalDailyDose"] }], "adult", KING_ADA_2019, "A"],
  ["ratio-217-plus-3", "217 / TDD + 3", [{ constant: 217, over: ["totalDailyDose"] }, { constant: 3 }], "adult",
    "King and Armstrong 2007, J Diabetes Sci Technol 1:42", "A"],
  ["ratio-2.6-pounds", "2.6 x pounds / TDD", [{ constant: 2.6, times: ["weightPounds"], over: ["totalDailyDose"] }], "adult",
    "Walsh 2010 and 2011", "S"],
  ["ratio-2.8-pounds", "2.8 x pounds / TDD", [{ constant: 2.8, times: ["weightPounds"], over: ["totalDailyDose"] }], "adult", "Davidson 2003", "S"],
  ["ratio-6-kg", "6 x kg / TDD", [{ constant: 6, times: ["weightKg"], over: ["totalDailyDose"] }], "adult", "AACE", "M"],
  ["ratio-450-regular", "450 / TDD", [{ constant: 450, over: ["totalDailyDose"] }], "regular-insulin",
    "ICMR guidelines for type 1 diabetes 2022, insulin chapter", "R"],
  ["ratio-365-type-2", "365 / TDD", [{ constant: 365, over: ["totalDailyDose"] }], "type-2", KING_2012_DIABETES, "A"],
  ["ratio-126-basal-type-2", "126 / basal of a day", [{ constant: 126, over: ["basalDailyDose"] }], "type-2", KING_2012_DIABETES, "A"],
  ["ratio-300-child", "300 / TDD, younger children or under 1 U for each kg", [{ constant: 300, over: ["totalDailyDose"] }], "child",
    "Royal Children's Hospital Melbourne", "R"],
  ["ratio-211-child-breakfast", "211 / TDD at breakfast, as measured at 2 to 10 years", [{ constant: 211, over: ["totalDailyDose"] }], "child",
    PMC5478012, "A"],
  ["ratio-434-child-other-meals", "434 / TDD at other meals, as measured at 2 to 10 years", [{ constant: 434, over: ["totalDailyDose"] }], "child",
    PMC5478012, "A"],
  ["ratio-330-preschool", "330 / TDD before school age", [{ constant: 330, over: ["totalDailyDose"] }], "child", ISPAD_2018_AND, "M"],
  ["ratio-250-preschool-breakfast", "250 / TDD at breakfast before school age", [{ constant: 250, over: ["totalDailyDose"] }], "child",
    ISPAD_2018_AND, "M"],
  ["ratio-300-breakfast-child", "300 / TDD at breakfast, low end of 300 to 350", [{ constant: 300, over: ["totalDailyDose"] }], "child", ISPAD, "M"],
  ["ratio-350-breakfast-child", "350 / TDD at breakfast, high end of 300 to 350", [{ constant: 350, over: ["totalDailyDose"] }], "child", ISPAD, "M"],
]);
