import { data } from "react-router";
import { z } from "zod";
import { Shell } from "~/components/frame/shell";
import { TagPage } from "~/components/tag/tag-page";
import { appContext } from "~/context";
import { readBuildTag } from "~/db/queries/tags.server";
import { formOf, readForm } from "~/http/form.server";
import { answer, idParam, publicOrigin, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { replaceTag } from "~/services/replace-tag.server";
import type { Route } from "./+types/tag";
import { qrPicture } from "./qr.server";

export const meta: Route.MetaFunction = ({ data: loaded }) => [
  { title: `Tag of ${loaded?.tag.nickname ?? "a vehicle"} · Plumbay` },
];

/** `?size=label` (62 × 100 mm, the default) or `?size=sheet` (four on letter or A4). */
export async function loader({ request, params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "tags:print");
  const buildId = idParam(params.buildId);
  const tag = await readBuildTag(context.get(appContext).db, actor.shopId, buildId);
  if (!tag) throw data({ message: "There is no such build in this shop." }, { status: 404 });
  const url = new URL(request.url);
  const address = `${publicOrigin(request)}/t/${tag.code}`;
  return {
    shell: await readShell(context, actor),
    buildId,
    tag,
    address,
    qr: qrPicture(address),
    size: url.searchParams.get("size") === "sheet" ? ("sheet" as const) : ("label" as const),
  };
}

/** A lost tag is replaced: `code` is the one that was on the screen. */
export async function action({ request, params, context }: Route.ActionArgs) {
  const form = await formOf(request);
  return answer(form, async () => {
    const { code } = readForm(
      form,
      z.object({ code: z.string({ error: "Which tag?" }).min(1, "Which tag?") }),
    );
    return replaceTag(serviceContext(context), { buildId: idParam(params.buildId), code });
  });
}

export default function Tag({ loaderData }: Route.ComponentProps) {
  return (
    <Shell shell={loaderData.shell}>
      <TagPage {...loaderData} />
    </Shell>
  );
}
