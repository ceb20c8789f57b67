import { useRevalidator } from "react-router";
import { may } from "~/auth/permissions";
import { countShows, pickRows, readCounterQuery } from "~/components/counter/counter-list";
import { CounterPage } from "~/components/counter/counter-page";
import { Shell } from "~/components/frame/shell";
import { appContext } from "~/context";
import { readBuildsHere } from "~/db/queries/builds.server";
import { requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { useLiveTouch } from "~/realtime/use-live";
import type { Route } from "./+types/counter";
import { remembered } from "./remembered.server";

export const meta: Route.MetaFunction = () => [{ title: "Counter · Plumbay" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "counter:see");
  const { db, now } = context.get(appContext);
  return remembered(request, "counter", "/counter", async () => {
    const query = readCounterQuery(new URL(request.url).searchParams);
    const all = await readBuildsHere(db, actor.shopId);
    const at = now().toISOString();
    return {
      shell: await readShell(context, actor),
      query,
      counts: countShows(all, at),
      rows: pickRows(all, query, at),
      mayBookIn: may(actor.role, "builds:book-in"),
    };
  });
}

export default function Counter({ loaderData }: Route.ComponentProps) {
  const { revalidate } = useRevalidator();
  const live = useLiveTouch(
    (touch) => touch.kind === "build" || touch.kind === "bay" || touch.kind === "yard",
    () => void revalidate(),
  );
  return (
    <Shell shell={loaderData.shell} live={live}>
      <CounterPage {...loaderData} now={loaderData.shell.now} timeZone={loaderData.shell.timeZone} />
    </Shell>
  );
}
