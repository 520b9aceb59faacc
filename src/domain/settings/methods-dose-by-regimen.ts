import { methodTable, type Method } from "./method";

const WALSH_ET_AL = "Walsh et al., publisher's page";

/**
 * Total daily dose of the new setup from the doses of the present one:
 * settings.md 1.2. U a day.
 */
export const DOSE_BY_REGIMEN_METHODS: ReadonlyArray<Method> = methodTable("totalDailyDose", [
  ["injections-0.75", "injections x 0.75", [{ constant: 0.75, times: ["injectionsDailyDose"] }], "adult",
    "UK pump e-learning, initial insulin doses; Imperial College pump checklist", "R"],
  ["injections-0.70", "injections x 0.70", [{ constant: 0.7, times: ["injectionsDailyDose"] }], "adult",
    "Diabetes Education Network UK, insulin pump workbook p. 12", "R"],
  ["injections-0.80", "injections x 0.80", [{ constant: 0.8, times: ["injectionsDailyDose"] }], "adult", "UK patient information site", "R"],
  ["injections-0.90", "injections x 0.90, high end of 0.75 to 0.90", [{ constant: 0.9, times: ["injectionsDailyDose"] }], "adult",
    "AACE/ACE 2010 and 2014", "M"],
  ["mean-of-two", "mean of injections x 0.75 and 0.5 U for each kg", [{ constant: 0.375, times: ["injectionsDailyDose"] }, { constant: 0.25, times: ["weightKg"] }], "adult",
    "PMC10563601, table 3", "R"],
  ["pump-unchanged", "pump dose as it is, settings carried over", [{ constant: 1, times: ["pumpDailyDose"] }], "adult",
    "Phillip 2023, Endocr Rev, table 7", "R"],
  ["pump-0.95", "pump dose x 0.95 where lows are frequent", [{ constant: 0.95, times: ["pumpDailyDose"] }], "adult", WALSH_ET_AL, "R"],
  ["pump-0.90", "pump dose x 0.90 where lows are frequent", [{ constant: 0.9, times: ["pumpDailyDose"] }], "adult", WALSH_ET_AL, "R"],
]);
