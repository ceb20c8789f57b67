import type { Actor } from "~/auth/actor";
import { may } from "~/auth/permissions";
import type { FloorMay } from "~/components/floor/floor-context";
import { FloorScreen } from "~/components/floor/floor-screen";
import { appContext } from "~/context";
import { readBoard } from "~/db/queries/board.server";
import { readUndoable } from "~/db/queries/undo.server";
import { requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import type { Route } from "./+types/floor";

export const meta: Route.MetaFunction = () => [{ title: "Floor · Plumbay" }];

function floorMay({ role, personId }: Actor): FloorMay {
  const person = personId !== null;
  return {
    move: person && may(role, "floor:move"),
    assign: person && may(role, "crew:assign"),
    hold: person && may(role, "holds:set"),
    measure: person && may(role, "layouts:measure"),
    bookIn: may(role, "builds:book-in"),
    seeLayouts: may(role, "layouts:see"),
    seeBuilds: may(role, "builds:see"),
    printTags: may(role, "tags:print"),
  };
}

export async function loader({ context }: Route.LoaderArgs) {
  const actor = requireActor(context, "floor:see");
  const { db, now } = context.get(appContext);
  const allowed = floorMay(actor);
  const last =
    allowed.move && actor.personId !== null
      ? await readUndoable(db, actor.shopId, actor.personId, now())
      : null;
  return {
    shell: await readShell(context, actor),
    board: await readBoard(db, actor.shopId, now()),
    undoable: last ? { words: last.words, at: last.at.toISOString() } : null,
    may: allowed,
  };
}

export default function FloorPage({ loaderData }: Route.ComponentProps) {
  const { shell, board, undoable, may: allowed } = loaderData;
  return <FloorScreen served={board} shell={shell} undoable={undoable} may={allowed} />;
}
