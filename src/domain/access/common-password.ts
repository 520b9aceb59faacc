/** Words that a guesser would try first, here: the product's and the trade's, and what keyboards suggest. */
const GUESSABLE = [
  "notchbook", "password", "passphrase", "insulin", "diabetes", "glucose", "closedloop", "mentor", "educator", "journal",
  "qwertyuiop", "asdfghjkl", "zxcvbnm", "letmein", "iloveyou", "welcome", "administrator", "trustno1", "changeme", "abcdefgh",
];

/**
 * Whether a password falls to the first guesses: one or two guessable words
 * padded with digits or signs, a short piece repeated, or a run of neighbours.
 */
export function isCommonPassword(password: string): boolean {
  const letters = password.normalize("NFKC").toLowerCase();
  const rest = GUESSABLE.reduce((left, word) => left.replaceAll(word, ""), letters).replace(/[\d\W_]/g, "");
  if (rest.length < 4) return true;
  if (/^(.{1,4})\1+.{0,3}$/.test(letters)) return true;
  return isRun(letters);
}

function isRun(text: string): boolean {
  let steps = 0;
  for (let i = 1; i < text.length; i += 1) {
    if (Math.abs(text.charCodeAt(i) - text.charCodeAt(i - 1)) <= 1) steps += 1;
  }
  return steps >= text.length - 3;
}
