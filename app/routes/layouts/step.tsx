import { data, isRouteErrorResponse, useRevalidator } from "react-router";
import { may } from "~/auth/permissions";
import { Shell } from "~/components/frame/shell";
import { LayoutPage } from "~/components/layout/layout-page";
import { appContext } from "~/context";
import { isStepId, LAYOUT_STEPS } from "~/domain/layout/steps";
import { idParam, orErrorPage, requireActor } from "~/http/request.server";
import { readShell } from "~/http/shell.server";
import { useLiveTouch } from "~/realtime/use-live";
import { readLayout } from "~/services/layouts/read-layout.server";
import { whyNoWeld } from "~/services/layouts/weld-skill.server";
import type { Route } from "./+types/step";

export const meta: Route.MetaFunction = ({ data: loaded }) => [
  {
    title: loaded
      ? `${labelOf(loaded.step)} · ${loaded.view.vehicle.nickname} · Plumbay`
      : "Layout · Plumbay",
  },
];

const labelOf = (id: string): string => LAYOUT_STEPS.find((step) => step.id === id)?.label ?? "Layout";

export async function loader({ params, context }: Route.LoaderArgs) {
  const actor = requireActor(context, "layouts:see");
  const { step } = params;
  if (!isStepId(step)) throw data({ message: "A layout has no such step." }, { status: 404 });
  const { db, now } = context.get(appContext);
  const { personId } = actor;
  const person = personId !== null;
  return {
    step,
    view: await orErrorPage(() => readLayout(db, actor.shopId, idParam(params.layoutId))),
    shell: await readShell(context, actor),
    may: {
      measure: person && may(actor.role, "layouts:measure"),
      approve: person && may(actor.role, "options:approve"),
      whyNoWeld: person && step === "weld" ? await whyNoWeld(db, { ...actor, personId }, now()) : null,
    },
  };
}

type Loaded = Awaited<ReturnType<typeof loader>>;
/** What this tab was last served of a layout, to go on with while there is no link. */
let last: { layoutId: string; loaded: Loaded } | null = null;

/** Without a link the steps of this layout still open, from what was last read: the measuring goes on. */
export async function clientLoader({ params, serverLoader }: Route.ClientLoaderArgs): Promise<Loaded> {
  try {
    const loaded = await serverLoader();
    last = { layoutId: params.layoutId, loaded };
    return loaded;
  } catch (error) {
    const answered = error instanceof Response || isRouteErrorResponse(error);
    if (answered || last?.layoutId !== params.layoutId || !isStepId(params.step)) throw error;
    return { ...last.loaded, step: params.step };
  }
}

export default function StepPage({ loaderData }: Route.ComponentProps) {
  const { view, step, shell } = loaderData;
  const { revalidate } = useRevalidator();
  const live = useLiveTouch(
    (touch) =>
      (touch.kind === "layout" && touch.id === view.id) ||
      (touch.kind === "build" && touch.id === view.vehicle.buildId) ||
      (touch.kind === "bay" && touch.id === view.bay.id),
    () => void revalidate(),
  );
  return (
    <Shell shell={shell} live={live}>
      <LayoutPage
        key={view.id}
        view={view}
        step={step}
        may={loaderData.may}
        person={shell.person.name}
        servedAt={shell.now}
        live={live}
        refresh={() => void revalidate()}
      />
    </Shell>
  );
}
