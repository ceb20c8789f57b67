import { Link } from "react-router";
import { LayoutSheet } from "~/components/layout/sheet/layout-sheet";
import { QrSvg } from "~/components/tag/qr-svg";
import { appContext } from "~/context";
import { idParam, orErrorPage, publicOrigin, requireActor } from "~/http/request.server";
import { readLayout } from "~/services/layouts/read-layout.server";
import { Button, buttonClass } from "~/ui/button";
import { Verdict } from "~/ui/verdict";
import { qrPicture } from "../builds/qr.server";
import type { Route } from "./+types/sheet";

export const meta: Route.MetaFunction = ({ data }) => [
  { title: `Layout sheet${data ? ` · ${data.view.vehicle.nickname}` : ""} · Plumbay` },
];

export async function loader({ request, params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "layouts:see");
  const { db, now } = context.get(appContext);
  const view = await orErrorPage(() => readLayout(db, actor.shopId, idParam(params.layoutId)));
  return {
    view,
    qr: qrPicture(`${publicOrigin(request)}/t/${view.vehicle.code}`),
    printedAt: now().toISOString(),
  };
}

export default function Sheet({ loaderData }: Route.ComponentProps) {
  const { view, qr, printedAt } = loaderData;
  const { approval } = view;
  const option =
    approval?.state === "void"
      ? approval.signed
      : (view.options?.find((one) => one.key === view.choice?.key) ?? approval?.signed ?? null);
  return (
    <div className="min-h-dvh bg-concrete-200 py-4 print:bg-white print:py-0">
      <nav className="no-print mx-auto mb-4 flex w-[816px] max-w-full gap-3 px-4" aria-label="Sheet">
        <Button tone="go" onClick={() => window.print()} disabled={!option || !view.approval}>
          Print
        </Button>
        <Link className={buttonClass("plain", "m")} to={`/layouts/${view.id}/step/approval`}>
          Back to the layout
        </Link>
      </nav>
      {option && view.approval ? (
        <main className="overflow-x-auto">
          <LayoutSheet
            view={view}
            option={option}
            printedAt={printedAt}
            qr={<QrSvg {...qr} name={`QR code of ${view.vehicle.nickname}`} />}
          />
        </main>
      ) : (
        <main className="mx-auto max-w-2xl p-4">
          <h1 className="sr-only">Layout sheet</h1>
          <Verdict
            tone={view.approval ? "void" : "empty"}
            sign={view.approval ? "void" : "approve"}
            title={
              view.approval
                ? `Sheet ${view.approval.sheetRevision} is void: ${view.approval.voided?.reason ?? "a number changed"}.`
                : "There is no sheet yet."
            }
            detail="A sheet is made when the foreman approves an option. Nothing is marked before that."
          />
        </main>
      )}
    </div>
  );
}
