import { parse } from "csv-parse/sync";

export const DELIMITERS = [";", "\t", "|", ","] as const;
export type Delimiter = (typeof DELIMITERS)[number];

const LINES = 60;

/** The options of the parser that the preview and the import share. */
export const PARSER_OPTIONS = { relax_quotes: true, relax_column_count: true, skip_empty_lines: true, bom: true } as const;

function rowsWith(text: string, delimiter: Delimiter): string[][] {
  try {
    const rows: string[][] = parse(text, { ...PARSER_OPTIONS, delimiter, to: LINES });
    return rows;
  } catch {
    return [];
  }
}

/**
 * The delimiter under which most lines have the same number of fields, more
 * than one. Semicolon, tab and bar come before the comma, since a decimal comma
 * makes a comma look like a delimiter.
 */
export function guessDelimiter(text: string): Delimiter {
  let best: { delimiter: Delimiter; score: number } = { delimiter: ",", score: 0 };
  for (const delimiter of DELIMITERS) {
    const widths = rowsWith(text, delimiter).map((row) => row.length);
    const counts = new Map<number, number>();
    for (const width of widths) if (width > 1) counts.set(width, (counts.get(width) ?? 0) + 1);
    const score = Math.max(0, ...counts.values()) / Math.max(1, widths.length);
    if (score > best.score + 0.01) best = { delimiter, score };
  }
  return best.delimiter;
}

/** The first lines as fields. */
export function previewRows(text: string, delimiter: Delimiter): string[][] {
  return rowsWith(text, delimiter);
}
