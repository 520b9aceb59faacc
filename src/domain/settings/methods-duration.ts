import { methodTable, type Method } from "./method";

const PMC10563601_TABLE_3 = "PMC10563601, table 3";
const WALSH_2011 = "Walsh 2011";

/**
 * Duration of insulin action in minutes: settings.md 1.7. The duration of a bolus
 * calculator, of a straight-line model and of an exponential model are three
 * different numbers; none is copied into another without a note.
 */
export const DURATION_METHODS: ReadonlyArray<Method> = methodTable("durationOfAction", [
  ["duration-4-h", "4 h, most adults", [{ constant: 240 }], "adult", PMC10563601_TABLE_3, "R"],
  ["duration-5-h", "5 h, older adults or kidney disease", [{ constant: 300 }], "adult", PMC10563601_TABLE_3, "R"],
  ["duration-4.5-h", "4.5 h, low end of 4.5 to 6.5", [{ constant: 270 }], "adult", WALSH_2011, "M"],
  ["duration-6.5-h", "6.5 h, high end of 4.5 to 6.5", [{ constant: 390 }], "adult", WALSH_2011, "M"],
  ["duration-3-h-pregnancy", "3 h in pregnancy", [{ constant: 180 }], "pregnancy", PMC10563601_TABLE_3, "R"],
  ["duration-3-h-child", "3 h, children", [{ constant: 180 }], "child", "PMC10563601, table 3; Perth children's hospital parent guide", "R"],
  ["duration-2.6-h-child", "2.6 h, as measured before puberty", [{ constant: 156 }], "child", "PMC5478012", "A"],
]);
