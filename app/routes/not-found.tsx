import { data } from "react-router";
import { may } from "~/auth/permissions";
import { Shell } from "~/components/frame/shell";
import { NothingHere } from "~/components/scan/nothing-here";
import { actorContext } from "~/context";
import { readShell } from "~/http/shell.server";
import type { Route } from "./+types/not-found";

export const meta: Route.MetaFunction = () => [{ title: "Nothing here · Plumbay" }];

/** Says the same to everyone; those who are signed in also get the ways on that are open to them. */
export async function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  return data(
    {
      shell: actor ? await readShell(context, actor) : null,
      mayScan: actor !== null && may(actor.role, "scan:use"),
    },
    { status: 404 },
  );
}

export default function NotFound({ loaderData }: Route.ComponentProps) {
  const { shell, mayScan } = loaderData;
  if (!shell) return <NothingHere areas={[]} mayScan={false} signedIn={false} />;
  return (
    <Shell shell={shell}>
      <NothingHere areas={shell.areas} mayScan={mayScan} signedIn />
    </Shell>
  );
}
