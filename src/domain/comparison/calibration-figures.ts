type Cell = Readonly<{ condition: string; rates: Readonly<{ better: number | null }> }>;

/** The largest share of changes that did nothing and were called better, over every outcome. 0 to 1. */
export function highestFalseBetter({ cells }: Readonly<{ cells: ReadonlyArray<Cell> }>): number {
  return Math.max(...cells.filter(({ condition }) => condition === "nothing").map(({ rates }) => rates.better ?? 0));
}
