import { levelVerdict } from "../../domain/layout/level";
import type { LevelView } from "../../domain/layout/view";

const lower = (words: string): string => words.charAt(0).toLowerCase() + words.slice(1);

/** The level's state in the fewest words that say it: "Level true, nose high 0.04°". */
export function levelWords(level: LevelView | null): string {
  if (!level) return "Not levelled yet";
  if (level.state === "void") return `Level void: ${level.voided?.reason ?? "it was broken"}`;
  const { headline } = levelVerdict(
    { noseHigh: level.noseHighDeg, rightHigh: level.rightHighDeg },
    level.allowedDeg,
  );
  const slope = lower(headline.replace(/\.$/, ""));
  return level.state === "true" ? `Level true, ${slope}` : `Not true yet: ${slope}`;
}
