import { redirect, useNavigate } from "react-router";
import { Shell } from "~/components/frame/shell";
import { readScan } from "~/components/scan/read-scan";
import { ScanDesk } from "~/components/scan/scan-desk";
import { requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import type { Route } from "./+types/scan";

export const meta: Route.MetaFunction = () => [{ title: "Scan · Plumbay" }];

/** `?code=`: what was typed or scanned; a good one goes on to its vehicle. */
export async function loader({ request, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "scan:use");
  const typed = new URL(request.url).searchParams.get("code");
  const scanned = typed === null ? null : readScan(typed);
  if (scanned?.ok) throw redirect(`/t/${scanned.code}`);
  return { shell: await readShell(context, actor), typed: typed ?? "", problem: scanned?.words ?? null };
}

export default function Scan({ loaderData }: Route.ComponentProps) {
  const navigate = useNavigate();
  return (
    <Shell shell={loaderData.shell}>
      <ScanDesk
        typed={loaderData.typed}
        problem={loaderData.problem}
        onCode={(code) => void navigate(`/t/${code}`)}
        onText={(text) => void navigate(`/scan?code=${encodeURIComponent(text)}`, { replace: true })}
      />
    </Shell>
  );
}
