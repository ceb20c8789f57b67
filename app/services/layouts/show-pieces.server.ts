import { and, eq } from "drizzle-orm";
import { schema, type Tx } from "../../db/client.server";
import type { Progress } from "../../domain/layout/work-list";

const { stages } = schema;

/** The floor and the wall say how many brackets of the stage Weld are done. */
export async function showPieces(tx: Tx, buildId: number, { done, of }: Progress): Promise<void> {
  await tx
    .update(stages)
    .set({ piecesDone: done, piecesOf: of, piecesWord: "brackets" })
    .where(and(eq(stages.buildId, buildId), eq(stages.kind, "weld")));
}
