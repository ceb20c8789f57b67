import { data, useRevalidator } from "react-router";
import { may } from "~/auth/permissions";
import { BuildPage } from "~/components/builds/build-page";
import { Shell } from "~/components/frame/shell";
import { appContext } from "~/context";
import { readBayCards, readStanding, snapshot } from "~/db/queries/board.server";
import { readBuild, readStages, readStandingHolds, readStory } from "~/db/queries/builds.server";
import { idParam, requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { useLiveTouch } from "~/realtime/use-live";
import type { Route } from "./+types/build";

export const meta: Route.MetaFunction = ({ data: loaded }) => [
  { title: `${loaded?.build.nickname ?? "Build"} · Plumbay` },
];

export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "builds:see");
  const buildId = idParam(params.buildId);
  const { db } = context.get(appContext);
  const { shopId, role } = actor;
  const read = await snapshot(db, async (tx) => {
    const build = await readBuild(tx, shopId, buildId);
    if (!build) return null;
    const standing = await readStanding(tx, shopId, buildId);
    const [card] = standing?.bayId ? await readBayCards(tx, shopId, [standing.bayId]) : [];
    return {
      build,
      stages: await readStages(tx, buildId),
      holds: await readStandingHolds(tx, buildId),
      standing: standing?.vehicle ?? null,
      bay: card?.bay ?? null,
      story: await readStory(tx, shopId, buildId),
    };
  });
  if (!read) throw data({ message: "There is no such build in this shop." }, { status: 404 });
  const { customer, ...build } = read.build;
  return {
    ...read,
    build,
    // A customer's name and number are for the counter, the foreman and the owner.
    customer: may(role, "counter:see") ? customer : null,
    mayPrint: may(role, "tags:print"),
    mayChange: may(role, "builds:book-in"),
    mayMeasure: may(role, "layouts:measure"),
    shell: await readShell(context, actor),
  };
}

export default function Build({ loaderData }: Route.ComponentProps) {
  const { revalidate } = useRevalidator();
  const { build, bay, standing } = loaderData;
  const live = useLiveTouch(
    (touch) =>
      (touch.kind === "build" && touch.id === build.id) ||
      (touch.kind === "layout" && touch.id === standing?.layoutId) ||
      (touch.kind === "bay" && touch.id === bay?.id),
    () => void revalidate(),
  );
  return (
    <Shell shell={loaderData.shell} live={live}>
      <BuildPage
        {...loaderData}
        now={loaderData.shell.now}
        timeZone={loaderData.shell.timeZone}
        unit={loaderData.shell.unit}
      />
    </Shell>
  );
}
