import { methodTable, type Method } from "./method";

const ICMR_GUIDELINES_FOR = "ICMR guidelines for type 1 diabetes 2022, insulin chapter";
const MSD_MANUAL_PROFESSIONAL = "MSD Manual Professional 2024";
const UPTODATE_TABLE = "UpToDate table";
const DIABETES_CARE_TABLE = "Diabetes Care, table 5 on regimens after ketoacidosis";
const ISPAD_INSULIN_CHAPTER = "ISPAD insulin chapter 2018 and 2022";
const AACE_2010_PREGNANCY = "AACE 2010 pregnancy protocol";

/**
 * Total daily dose from body weight in childhood and pregnancy: settings.md 1.1.
 * U a day. The gate is closed for both, so only an educator ever sees these.
 */
export const DOSE_EDUCATOR_ONLY_METHODS: ReadonlyArray<Method> = methodTable("totalDailyDose", [
  ["weight-0.5-remission", "up to 0.5 U for each kg, remission", [{ constant: 0.5, times: ["weightKg"] }], "child", ICMR_GUIDELINES_FOR, "R"],
  ["weight-0.7-before-puberty", "0.7 U for each kg before puberty, low end", [{ constant: 0.7, times: ["weightKg"] }], "child",
    ICMR_GUIDELINES_FOR, "R"],
  ["weight-0.9-before-puberty", "0.9 U for each kg before puberty, high end", [{ constant: 0.9, times: ["weightKg"] }], "child",
    ICMR_GUIDELINES_FOR, "R"],
  ["weight-1.2-puberty", "1.2 U for each kg in puberty, low end", [{ constant: 1.2, times: ["weightKg"] }], "child", ICMR_GUIDELINES_FOR, "R"],
  ["weight-2.0-puberty", "2.0 U for each kg in puberty, high end", [{ constant: 2, times: ["weightKg"] }], "child", ICMR_GUIDELINES_FOR, "R"],
  ["weight-0.7-after-remission", "0.7 U for each kg after remission, low end", [{ constant: 0.7, times: ["weightKg"] }], "child",
    MSD_MANUAL_PROFESSIONAL, "R"],
  ["weight-1.0-after-remission", "1.0 U for each kg after remission, high end", [{ constant: 1, times: ["weightKg"] }], "child",
    MSD_MANUAL_PROFESSIONAL, "R"],
  ["weight-1.5-puberty", "up to 1.5 U for each kg in puberty", [{ constant: 1.5, times: ["weightKg"] }], "child", MSD_MANUAL_PROFESSIONAL, "R"],
  ["weight-0.3-new", "0.3 U for each kg, newly diagnosed before puberty, low end", [{ constant: 0.3, times: ["weightKg"] }], "child",
    UPTODATE_TABLE, "R"],
  ["weight-0.7-new", "0.7 U for each kg, newly diagnosed before puberty, high end", [{ constant: 0.7, times: ["weightKg"] }], "child",
    UPTODATE_TABLE, "R"],
  ["weight-1.0-new", "1.0 U for each kg, puberty or after ketoacidosis, high end", [{ constant: 1, times: ["weightKg"] }], "child",
    UPTODATE_TABLE, "R"],
  ["weight-0.75-after-ketoacidosis", "0.75 U for each kg after ketoacidosis, before puberty, low end", [{ constant: 0.75, times: ["weightKg"] }], "child",
    DIABETES_CARE_TABLE, "R"],
  ["weight-1.0-after-ketoacidosis", "1.0 U for each kg after ketoacidosis, before and in puberty", [{ constant: 1, times: ["weightKg"] }], "child",
    DIABETES_CARE_TABLE, "R"],
  ["weight-1.2-after-ketoacidosis", "1.2 U for each kg after ketoacidosis, in puberty, high end", [{ constant: 1.2, times: ["weightKg"] }], "child",
    DIABETES_CARE_TABLE, "R"],
  ["weight-0.7-ispad", "0.7 U for each kg before puberty, low end of 0.7 to 1.0", [{ constant: 0.7, times: ["weightKg"] }], "child",
    ISPAD_INSULIN_CHAPTER, "M"],
  ["weight-1.0-ispad", "1.0 U for each kg, high end before and low end in puberty", [{ constant: 1, times: ["weightKg"] }], "child",
    ISPAD_INSULIN_CHAPTER, "M"],
  ["weight-2.0-ispad", "2.0 U for each kg in puberty, high end of 1 to 2", [{ constant: 2, times: ["weightKg"] }], "child",
    ISPAD_INSULIN_CHAPTER, "M"],
  ["weight-0.6-preconception", "0.6 U for each kg before conception", [{ constant: 0.6, times: ["weightKg"] }], "pregnancy",
    AACE_2010_PREGNANCY, "S"],
  ["weight-0.7-first-trimester", "0.7 U for each kg, first trimester", [{ constant: 0.7, times: ["weightKg"] }], "pregnancy",
    AACE_2010_PREGNANCY, "S"],
  ["weight-0.8-second-trimester", "0.8 U for each kg, second trimester", [{ constant: 0.8, times: ["weightKg"] }], "pregnancy",
    AACE_2010_PREGNANCY, "S"],
  ["weight-0.9-third-trimester", "0.9 U for each kg, third trimester", [{ constant: 0.9, times: ["weightKg"] }], "pregnancy",
    AACE_2010_PREGNANCY, "M"],
  ["weight-1.0-term", "1.0 U for each kg, at term", [{ constant: 1, times: ["weightKg"] }], "pregnancy", AACE_2010_PREGNANCY, "M"],
]);
