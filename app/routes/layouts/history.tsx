import { data, Link } from "react-router";
import { Shell } from "~/components/frame/shell";
import { LayoutHistory } from "~/components/layout/history/layout-history";
import { appContext } from "~/context";
import { readLayoutHistory } from "~/db/queries/layout-history.server";
import { readLayoutHead } from "~/db/queries/layouts.server";
import { idParam, requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { buttonClass } from "~/ui/button";
import { Tape } from "~/ui/tape";
import type { Route } from "./+types/history";

export const meta: Route.MetaFunction = () => [{ title: "History of the layout · Plumbay" }];

/** `?what=`: only lines of one kind. */
export async function loader({ request, params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "layouts:see");
  const { db } = context.get(appContext);
  const layoutId = idParam(params.layoutId);
  const head = await readLayoutHead(db, actor.shopId, layoutId);
  if (!head) throw data({ message: "There is no such layout." }, { status: 404 });
  return {
    shell: await readShell(context, actor),
    layoutId,
    nickname: head.vehicle.nickname,
    code: head.code ?? "",
    what: new URL(request.url).searchParams.get("what"),
    lines: await readLayoutHistory(db, actor.shopId, layoutId),
  };
}

export default function HistoryPage({ loaderData }: Route.ComponentProps) {
  const { shell, layoutId, nickname, code, what, lines } = loaderData;
  return (
    <Shell shell={shell}>
      <main className="mx-auto grid w-full max-w-5xl gap-6 p-6">
        <div className="flex flex-wrap items-center gap-4">
          <Tape name={nickname} code={code} />
          <h1 className="font-label text-3xl font-semibold">What happened to this layout</h1>
          <div className="ml-auto flex flex-wrap gap-3">
            <a className={buttonClass("plain", "m")} href={`/layouts/${layoutId}/readings.csv`} download>
              Every reading, as a table
            </a>
            <Link className={buttonClass("plain", "m")} to={`/layouts/${layoutId}`}>
              To the layout
            </Link>
          </div>
        </div>
        <LayoutHistory lines={lines} what={what} timeZone={shell.timeZone} />
      </main>
    </Shell>
  );
}
