import { type Context, change, requirePerson } from "./change.server";
import { type Move, moveInside, placeWords, touchedByMove } from "./floor-moves.server";

/**
 * Moves a vehicle to a bay or to the yard.
 * @returns where it stands now, and whether its level went with the move
 * @throws Refusal conflict with `detail.check` (will not go) or `detail.moved` (somebody was faster), ask-first with
 * `detail.check` (what it costs)
 */
export async function moveVehicle(ctx: Context, move: Move): Promise<{ words: string; voided: boolean }> {
  const actor = requirePerson(ctx, "floor:move");
  return change(ctx, async (tx, note) => {
    const moved = await moveInside(tx, ctx, actor.personId, move, note);
    const words = `${moved.vehicle.nickname} to ${placeWords(moved.toBay)}`;
    note({
      verb: "move-vehicle",
      subject: { kind: "build", id: move.buildId },
      words,
      before: { bayId: moved.fromBay?.id ?? null, place: placeWords(moved.fromBay) },
      after: { bayId: moved.toBay?.id ?? null, place: placeWords(moved.toBay), voided: moved.voided },
      touches: touchedByMove(moved, moved.vehicle.layoutId),
    });
    return { words, voided: moved.voided };
  });
}
