import { data, redirect } from "react-router";
import { may } from "~/auth/permissions";
import { Shell } from "~/components/frame/shell";
import { NoSuchTag } from "~/components/scan/no-such-tag";
import { readScan } from "~/components/scan/read-scan";
import { appContext } from "~/context";
import { lookUpTag } from "~/db/queries/tags.server";
import { requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import type { Route } from "./+types/tag";

export const meta: Route.MetaFunction = () => [{ title: "Tag · Plumbay" }];

/** Where a tag leads: to the layout's next open step for those who measure, else to the build. */
export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "scan:use");
  const scanned = readScan(params.code);
  const shell = () => readShell(context, actor);
  if (!scanned.ok)
    return data(
      {
        shell: await shell(),
        typed: params.code,
        why: { state: "unreadable" as const, words: scanned.words },
      },
      { status: 404 },
    );
  if (scanned.code !== params.code) throw redirect(`/t/${scanned.code}`);
  const found = await lookUpTag(context.get(appContext).db, actor.shopId, scanned.code);
  if (found.state === "here") {
    if (found.layoutId !== null && may(actor.role, "layouts:measure"))
      throw redirect(`/layouts/${found.layoutId}`);
    throw redirect(`/builds/${found.buildId}`);
  }
  return data({ shell: await shell(), typed: params.code, why: found }, { status: 404 });
}

export default function Tag({ loaderData }: Route.ComponentProps) {
  return (
    <Shell shell={loaderData.shell}>
      <NoSuchTag typed={loaderData.typed} why={loaderData.why} timeZone={loaderData.shell.timeZone} />
    </Shell>
  );
}
