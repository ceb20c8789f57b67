import { data } from "react-router";
import { appContext } from "~/context";
import { readLayoutReadings } from "~/db/queries/layout-history.server";
import { readLayoutHead } from "~/db/queries/layouts.server";
import { csvOf, csvResponse } from "~/http/csv";
import { idParam, requireActor } from "~/http/request.server";
import type { Route } from "./+types/readings";

const HEAD = [
  "at (UTC)",
  "what",
  "point",
  "side",
  "as typed",
  "x (mm)",
  "y (mm)",
  "by",
  "device",
  "superseded at (UTC)",
  "why",
];

/** GET /layouts/<id>/readings.csv: every reading as it was typed, also those that were superseded. */
export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "layouts:see");
  const { db } = context.get(appContext);
  const layoutId = idParam(params.layoutId);
  const head = await readLayoutHead(db, actor.shopId, layoutId);
  if (!head) throw data({ message: "There is no such layout." }, { status: 404 });
  const rows = await readLayoutReadings(db, layoutId);
  return csvResponse(
    `readings-${head.vehicle.nickname}-${layoutId}.csv`,
    csvOf(
      HEAD,
      rows.map((row) => [
        row.at,
        row.what,
        row.point,
        row.side,
        row.typed,
        row.xMm,
        row.yMm,
        row.by,
        row.device,
        row.supersededAt,
        row.reason,
      ]),
    ),
  );
}
