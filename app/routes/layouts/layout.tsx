import { redirect } from "react-router";
import { appContext } from "~/context";
import { idParam, orErrorPage, requireActor } from "~/http/request.server";
import { readLayout } from "~/services/layouts/read-layout.server";
import type { Route } from "./+types/layout";

/** A layout's own address leads to the step that is next. */
export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "layouts:see");
  const { db } = context.get(appContext);
  const layout = await orErrorPage(() => readLayout(db, actor.shopId, idParam(params.layoutId)));
  throw redirect(`/layouts/${layout.id}/step/${layout.next}`);
}

export default function Layout() {
  return null;
}
