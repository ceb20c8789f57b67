import { appContext } from "~/context";
import { readBoard } from "~/db/queries/board.server";
import { requireActor } from "~/http/request.server";
import type { Route } from "./+types/board";

/** GET /api/v1/board: the floor as it is now (see domain/floor/board.ts for its shape). */
export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "board:see");
  const { db, now } = context.get(appContext);
  return Response.json(await readBoard(db, actor.shopId, now()));
}
