import { existsSync, readFileSync } from "node:fs";

const OPEN_DATA = "../shared/data/glucose/five_people_three.csv";

/** The open five-person file where it is at hand, otherwise a generated one of the same shape; says aloud which. */
export function glucoseFile(): { name: string; text: string; isOpenData: boolean } {
  if (existsSync(OPEN_DATA)) return { name: "five_people_three.csv", text: readFileSync(OPEN_DATA, "utf8"), isOpenData: true };
  console.log("skipped: ../shared is absent, so a generated file stands in for the open five-person data");
  const rows = ["id,time,gl"];
  for (let i = 0; i < 13 * 288; i += 1) {
    const at = new Date(Date.UTC(2015, 5, 6) + i * 300_000).toISOString().slice(0, 19).replace("T", " ");
    rows.push(`Subject_1,${at},${Math.round(130 + 40 * Math.sin(i / 40) + 15 * Math.sin(i / 7))}`);
  }
  return { name: "generated.csv", text: rows.join("\n"), isOpenData: false };
}
