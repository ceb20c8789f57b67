import { CODE_ALPHABET, CODE_LENGTH, readCode } from "../../domain/tags/short-code";

/** What each sign that no tag carries is most often mistaken for; only signs that tags do carry. */
const LOOKS_LIKE: Record<string, string> = {
  "0": "C, D or Q",
  O: "C, D or Q",
  "1": "7, J or T",
  I: "J, T or 7",
  L: "E or J",
  "2": "7",
  Z: "7",
  "5": "6 or 9",
  S: "9 or 6",
  "8": "3, 6 or R",
  B: "R, 3 or 6",
  U: "W or J",
  V: "Y or W",
};

export type Scanned = { ok: true; code: string } | { ok: false; words: string };

const says = (words: string): Scanned => ({ ok: false, words });

/**
 * Reads what a person typed or a scanner sent and, when it cannot be a tag of ours, says why in words that help to
 * look at the tag again.
 */
export function readScan(typed: string): Scanned {
  const code = readCode(typed);
  if (code) return { ok: true, code };
  const text = typed.trim();
  if (text === "") return says(`Type the ${CODE_LENGTH} signs under the picture on the tag.`);
  if (/^[a-z][a-z0-9+.-]*:/i.test(text) || text.includes("/"))
    return says("That picture is not one of our tags. Look for the tag that hangs on the vehicle.");
  const signs = [...text.replace(/[\s\-.]/g, "").toUpperCase()];
  const stranger = signs.find((sign) => !CODE_ALPHABET.includes(sign));
  const likely = stranger && LOOKS_LIKE[stranger];
  if (signs.length <= CODE_LENGTH + 1 && stranger && likely)
    return says(`There is no ${stranger} on our tags: is it ${likely}?`);
  if (stranger && !likely)
    return says(`There is no “${stranger}” on our tags, only capital letters and digits.`);
  if (signs.length < CODE_LENGTH)
    return says(
      `A tag has ${CODE_LENGTH} signs; here ${signs.length === 1 ? "is 1" : `are ${signs.length}`}.`,
    );
  return says(`A tag has ${CODE_LENGTH} signs; here are ${signs.length}.`);
}
