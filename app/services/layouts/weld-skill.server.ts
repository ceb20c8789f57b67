import type { Reader } from "../../db/client.server";
import { readWeldSkill } from "../../db/queries/layout-work.server";

/** Why a person may not sign a weld, in words; null when they may. */
export async function whyNoWeld(
  tx: Reader,
  person: { shopId: number; personId: number; name: string },
  now: Date,
): Promise<string | null> {
  const skill = await readWeldSkill(tx, person.shopId, person.personId);
  if (!skill)
    return `Welds are signed by a qualified welder, and the shop's list has no weld skill for ${person.name}. Hand over to somebody who has it.`;
  if (skill.expiresAt !== null && skill.expiresAt <= now)
    return `${person.name}'s weld qualification has run out: the foreman has to see the new card first.`;
  return null;
}
