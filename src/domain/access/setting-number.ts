/**
 * Whether a text names a number for a setting. Numbers for settings come from
 * the educator; a mentor's comment that holds one is stopped (content.md 9).
 *
 * Looked for, in digits or number words: a number followed by U, units, U/h,
 * g/U or mg/dL (mmol/L) per U; a setting "to", "of" or "=" a number; a ratio
 * written 1:15; and a percentage in a sentence that names a setting, unless it
 * says a share of time or of readings. It rather stops one comment too many:
 * the writer can always send it as a question.
 */

const WORD_NUMBER = "half|quarter|one|two|three|four|five|six|seven|eight|nine|ten|eleven|twelve|fifteen|twenty|thirty|forty|fifty";
const NUMBER = `(?:\\d+(?:[.,]\\d+)?|\\b(?:${WORD_NUMBER})\\b(?: (?:a|an|and a half)\\b)?)`;
const PER = "\\s*(?:/|per|for (?:each|every|one|a))\\s*";
const INSULIN_UNIT = "(?:iu|u|units?)(?![a-z])";
const SETTING = "(?:basal(?: rate)?|(?:carb )?ratio|(?:sensitivity|correction)(?: factor)?|factor|target|bolus|dose|setting|duration)s?";

const WITH_UNIT = new RegExp(`${NUMBER}\\s*(?:(?:g|grams?|mg/dl|mmol/l|mg|mmol)(?: of)?(?: carbs?| carbohydrates?)?${PER})?${INSULIN_UNIT}`);
const SET_TO = new RegExp(`\\b${SETTING}\\s*(?:=|to|of)\\s*(?:about |around )?\\d`);
const RATIO = /\b1 ?: ?\d/;
const PERCENT = new RegExp(`${NUMBER}\\s*(?:%|per ?cent\\b)(?! (?:in range|below|above|low|high|of (?:the |all |my |your )?(?:day|days|night|nights|time|week|readings|meals)))`);
const NAMES_SETTING = new RegExp(`\\b(?:${SETTING}|insulin|stronger|weaker)\\b`);

/** @returns the words that name a number for a setting, or `null` */
export function findSettingNumber(text: string): string | null {
  const plain = text.normalize("NFKC").toLowerCase().replace(/\p{Cf}/gu, "").replace(/\s+/gu, " ");
  const found = WITH_UNIT.exec(plain) ?? SET_TO.exec(plain);
  if (found) return found[0];
  for (const sentence of plain.split(/[.!?](?=\s|$)/)) {
    if (!NAMES_SETTING.test(sentence)) continue;
    const inSentence = PERCENT.exec(sentence) ?? (sentence.includes("ratio") ? RATIO.exec(sentence) : null);
    if (inSentence) return inSentence[0];
  }
  return null;
}
