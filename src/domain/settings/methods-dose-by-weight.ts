import { methodTable, type Method } from "./method";

const PMC10563601_TABLE_3 = "PMC10563601, table 3";
const DIABETES_CARE_STANDARDS = "Diabetes Care standards of care 2018, section 8 (41 S1:S73)";
const INSULIN_THERAPY_TEXTBOOK = "insulin-therapy textbook chapter, step 3";
const STANDARDS_OF_CARE = "standards of care";

/**
 * Total daily dose from body weight, adults: settings.md 1.1. U a day.
 */
export const DOSE_BY_WEIGHT_METHODS: ReadonlyArray<Method> = methodTable("totalDailyDose", [
  ["weight-0.5", "0.5 U for each kg", [{ constant: 0.5, times: ["weightKg"] }], "adult", PMC10563601_TABLE_3, "R"],
  ["weight-0.23-pounds", "0.23 U for each pound", [{ constant: 0.23, times: ["weightPounds"] }], "adult", PMC10563601_TABLE_3, "R"],
  ["weight-0.4", "0.4 U for each kg, low end of 0.4 to 1.0", [{ constant: 0.4, times: ["weightKg"] }], "adult", DIABETES_CARE_STANDARDS, "R"],
  ["weight-1.0", "1.0 U for each kg, high end of 0.4 to 1.0", [{ constant: 1, times: ["weightKg"] }], "adult", DIABETES_CARE_STANDARDS, "R"],
  ["weight-pounds-over-4", "pounds divided by 4", [{ constant: 1, times: ["weightPounds"], dividedBy: 4 }], "adult",
    "diabetes teaching-centre leaflet", "S"],
  ["weight-0.3-active", "0.3 U for each kg, active and lean, or new onset", [{ constant: 0.3, times: ["weightKg"] }], "adult",
    INSULIN_THERAPY_TEXTBOOK, "R"],
  ["weight-0.5-sedentary", "0.5 U for each kg, sedentary", [{ constant: 0.5, times: ["weightKg"] }], "adult", INSULIN_THERAPY_TEXTBOOK, "R"],
  ["weight-0.6-large-meals", "0.6 U for each kg, large meals", [{ constant: 0.6, times: ["weightKg"] }], "adult", INSULIN_THERAPY_TEXTBOOK, "R"],
  ["weight-0.2-residual", "0.2 U for each kg, own insulin still made, low end", [{ constant: 0.2, times: ["weightKg"] }], "adult",
    STANDARDS_OF_CARE, "M"],
  ["weight-0.6-residual", "0.6 U for each kg, own insulin still made, high end", [{ constant: 0.6, times: ["weightKg"] }], "adult",
    STANDARDS_OF_CARE, "M"],
]);
