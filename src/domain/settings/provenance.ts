/**
 * How far a published number has been checked. The code stays with the number
 * wherever it is shown, so that a figure quoted from memory never looks like
 * one that was read.
 */
export const PROVENANCE = {
  R: "read in the source",
  A: "from the abstract",
  S: "as quoted by another page",
  M: "from memory, not verified",
  C: "computed for this page",
  CP: "common practice, no source",
} as const;

export type Provenance = keyof typeof PROVENANCE;

/**
 * The line that stands under a number: its source, and how it was read unless
 * it was read in the source itself.
 *
 * @returns for example "a 2010 paper (as quoted by another page)"
 */
export function sourceLine(source: string, provenance: Provenance): string {
  return provenance === "R" ? source : `${source} (${PROVENANCE[provenance]})`;
}
