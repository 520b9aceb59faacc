/** A file may have this many bytes: a year of five-minute readings is about 3 MB. */
export const FILE_BYTES_AT_MOST = 32 * 1024 * 1024;
export const ROWS_AT_MOST = 1_000_000;
export const CHUNK_BYTES = 256 * 1024;
/** The beginning of a file that the guesses are made from. */
export const PREVIEW_BYTES = 512 * 1024;
export const ROWS_A_STATEMENT = 10_000;
/** A run that has not been heard of for this long is taken to be dead. */
export const STALLED_AFTER_MS = 60_000;
export const REFUSALS_KEPT = 5_000;
