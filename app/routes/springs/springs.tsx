import { useRevalidator } from "react-router";
import { z } from "zod";
import { may } from "~/auth/permissions";
import { Shell } from "~/components/frame/shell";
import { lengthsOf, pickSprings, readSpringQuery } from "~/components/springs/spring-facts";
import { SpringsPage } from "~/components/springs/springs-page";
import { appContext } from "~/context";
import { readShop } from "~/db/queries/shop.server";
import { readHangers, readNextRackNumber, readRack } from "~/db/queries/springs.server";
import { formOf, readForm } from "~/http/form.server";
import { answer, requireActor, serviceContext } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { useLiveTouch } from "~/realtime/use-live";
import { addSpring, takeOutSpring } from "~/services/add-spring.server";
import { idField } from "~/validation/floor";
import { springForm } from "~/validation/spring";
import { remembered } from "../counter/remembered.server";
import type { Route } from "./+types/springs";

export const meta: Route.MetaFunction = () => [{ title: "Spring rack · Plumbay" }];

export async function loader({ request, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "springs:see");
  const { db } = context.get(appContext);
  return remembered(request, "springs", "/springs", async () => {
    const shell = await readShell(context, actor);
    const query = readSpringQuery(new URL(request.url).searchParams);
    const rack = await readRack(db, actor.shopId);
    return {
      shell,
      query,
      springs: pickSprings(rack, query, shell.unit),
      rackCount: rack.length,
      lengths: lengthsOf(rack),
      longestMm: Math.max(0, ...rack.map((spring) => spring.lengthMm)),
      nextRack: await readNextRackNumber(db, actor.shopId),
      hangers: await readHangers(db, actor.shopId),
      mayEdit: may(actor.role, "springs:edit"),
    };
  });
}

const TakeOut = z.object({ springId: idField });

/** `do`: "add" a spring to the rack, or "take-out" one. */
export async function action({ request, context }: Route.ActionArgs) {
  const actor = requireActor(context, "springs:edit");
  const form = await formOf(request);
  const ctx = serviceContext(context);
  if (form.get("do") === "take-out")
    return answer(form, () => takeOutSpring(ctx, readForm(form, TakeOut).springId));
  const { unit } = await readShop(ctx.db, actor.shopId);
  return answer(form, () => addSpring(ctx, readForm(form, springForm(unit))));
}

export default function Springs({ loaderData }: Route.ComponentProps) {
  const { revalidate } = useRevalidator();
  const live = useLiveTouch(
    (touch) => touch.kind === "springs",
    () => void revalidate(),
  );
  return (
    <Shell shell={loaderData.shell} live={live}>
      <SpringsPage {...loaderData} unit={loaderData.shell.unit} />
    </Shell>
  );
}
