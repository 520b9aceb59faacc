export type Encoding = "utf-8" | "utf-16le" | "utf-16be" | "windows-1252";

/**
 * How a file's bytes are to be read: its mark where it has one, UTF-8 where the
 * bytes are sound UTF-8, UTF-16 where every other byte is nought, else windows-1252.
 *
 * @param bytes the beginning of the file, up to a few hundred kB; a character cut at its end does not count against UTF-8
 */
export function guessEncoding(bytes: Uint8Array): Encoding {
  if (bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf) return "utf-8";
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return "utf-16le";
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return "utf-16be";
  const sample = bytes.subarray(0, 2000);
  let even = 0;
  let odd = 0;
  sample.forEach((byte, i) => {
    if (byte !== 0) return;
    if (i % 2 === 0) even += 1;
    else odd += 1;
  });
  if (odd > sample.length / 5) return "utf-16le";
  if (even > sample.length / 5) return "utf-16be";
  try {
    new TextDecoder("utf-8", { fatal: true }).decode(bytes, { stream: true });
    return "utf-8";
  } catch {
    return "windows-1252";
  }
}

/** Signs that a file is no text at all: a picture, an archive, a document. */
export function isBinary(bytes: Uint8Array): boolean {
  const starts = (...mark: number[]) => mark.every((byte, i) => bytes[i] === byte);
  return starts(0x89, 0x50, 0x4e, 0x47) || starts(0x50, 0x4b, 0x03, 0x04) || starts(0x25, 0x50, 0x44, 0x46) || starts(0x1f, 0x8b) || starts(0xff, 0xd8, 0xff);
}
