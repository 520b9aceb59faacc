import { methodTable, type Method } from "./method";

const KING_ADA_2019 = "King, ADA 2019, abstract 1108-P";
const KING_2012_DIABETES = "King 2012, Diabetes Technol Ther, dia.2012.0104";
const ISPAD_INSULIN_CHAPTER = "ISPAD insulin chapter";
const UPTODATE_TABLE = "UpToDate table";

/**
 * Basal insulin of a day: settings.md 1.3. U a day; the sources disagree by design.
 */
export const BASAL_METHODS: ReadonlyArray<Method> = methodTable("basal", [
  ["basal-0.50", "0.50 of the total daily dose", [{ constant: 0.5, times: ["totalDailyDose"] }], "adult",
    "UK insulin pump workbook; UK pump e-learning; Imperial College pump checklist", "R"],
  ["basal-0.40", "0.40 of the total daily dose", [{ constant: 0.4, times: ["totalDailyDose"] }], "adult",
    "family-practice notebook page; low end of 0.40 to 0.50 in leaflets", "R"],
  ["basal-0.60", "0.60 of the total daily dose, high end of 0.40 to 0.60", [{ constant: 0.6, times: ["totalDailyDose"] }], "adult",
    "Walsh and Roberts, publisher's page", "R"],
  ["basal-0.476", "0.476 of the total daily dose", [{ constant: 0.476, times: ["totalDailyDose"] }], "adult",
    "Walsh 2010, J Diabetes Sci Technol 4:1174", "S"],
  ["basal-0.48", "0.48 of the total daily dose", [{ constant: 0.48, times: ["totalDailyDose"] }], "adult", "Davidson 2003", "S"],
  ["basal-0.47", "0.47 of the total daily dose", [{ constant: 0.47, times: ["totalDailyDose"] }], "adult", "Davidson 2008", "S"],
  ["basal-0.30", "0.30 of the total daily dose, low end of 0.30 to 0.40", [{ constant: 0.3, times: ["totalDailyDose"] }], "adult",
    "King and Kuroda 2016, Curr Diab Rep, PMC4960276", "A"],
  ["basal-0.345", "0.345 of the total daily dose", [{ constant: 0.345, times: ["totalDailyDose"] }], "adult", KING_ADA_2019, "A"],
  ["basal-0.232-per-kg", "0.232 U for each kg", [{ constant: 0.232, times: ["weightKg"] }], "adult", KING_ADA_2019, "A"],
  ["basal-0.2-per-kg", "0.2 U for each kg", [{ constant: 0.2, times: ["weightKg"] }], "adult", "family-practice notebook page", "R"],
  ["basal-0.339-type-2", "0.339 of the total daily dose", [{ constant: 0.339, times: ["totalDailyDose"] }], "type-2", KING_2012_DIABETES, "A"],
  ["basal-0.226-per-kg-type-2", "0.226 U for each kg", [{ constant: 0.226, times: ["weightKg"] }], "type-2", KING_2012_DIABETES, "A"],
  ["basal-0.30-child", "0.30 of the total daily dose, low end of 0.30 to 0.50", [{ constant: 0.3, times: ["totalDailyDose"] }], "child",
    ISPAD_INSULIN_CHAPTER, "M"],
  ["basal-0.50-child", "0.50 of the total daily dose, high end of 0.30 to 0.50", [{ constant: 0.5, times: ["totalDailyDose"] }], "child",
    ISPAD_INSULIN_CHAPTER, "M"],
  ["basal-0.38-child", "0.38 of the total daily dose, as measured before puberty", [{ constant: 0.38, times: ["totalDailyDose"] }], "child",
    "Hanas and Andersson 2017, PMC5478012", "A"],
  ["basal-0.40-growth", "0.40 of the total daily dose in a growth phase", [{ constant: 0.4, times: ["totalDailyDose"] }], "child",
    UPTODATE_TABLE, "R"],
  ["basal-0.60-low-carbohydrate", "0.60 of the total daily dose on few carbohydrates", [{ constant: 0.6, times: ["totalDailyDose"] }], "child",
    UPTODATE_TABLE, "R"],
]);
