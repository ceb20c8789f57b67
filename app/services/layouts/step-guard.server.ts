import type { PersonActor } from "../../auth/actor";
import type { Permission } from "../../auth/permissions";
import type { Tx } from "../../db/client.server";
import { readBayOfBuild, readLayoutRow } from "../../db/queries/layouts.server";
import type { Touch } from "../../db/schema";
import { type StepId, whyShut } from "../../domain/layout/steps";
import { type Context, requirePerson } from "../change.server";
import { Refusal } from "../errors";
import { type LoadedLayout, loadLayout } from "./layout-state.server";

/**
 * Locks a layout for a change, loads it, and makes sure that the step may be worked on: two changes of one layout
 * follow one another, and each sees what the other did.
 * @throws Refusal not-found, or conflict in words when the step is shut
 */
export async function openStep(tx: Tx, ctx: Context, layoutId: number, step: StepId): Promise<LoadedLayout> {
  const { shopId } = ctx.actor;
  if (!(await readLayoutRow(tx, shopId, layoutId, true)))
    throw new Refusal("not-found", "There is no such layout.");
  const loaded = await loadLayout(tx, shopId, layoutId);
  const shut = whyShut(step, loaded.facts);
  if (shut) throw new Refusal("conflict", shut, {}, { shut: true });
  return loaded;
}

/** What a change of a layout touches: itself, its build, and the bay in which the vehicle stands. */
export async function layoutTouches(tx: Tx, layoutId: number, buildId: number): Promise<Touch[]> {
  const bay = await readBayOfBuild(tx, buildId);
  return [
    { kind: "layout", id: layoutId },
    { kind: "build", id: buildId },
    bay ? { kind: "bay", id: bay.id } : { kind: "yard" },
  ];
}

export const measurer = (ctx: Context, permission: Permission = "layouts:measure"): PersonActor =>
  requirePerson(ctx, permission);
