import { TZDate } from "@date-fns/tz";
import { and, eq } from "drizzle-orm";
import type { PersonActor } from "../../auth/actor";
import { schema, type Tx } from "../../db/client.server";
import type { WorkItemRow } from "../../db/queries/layout-work.server";
import type { StageKind } from "../../domain/builds/stages";
import { entryFaults, type WorkEntry } from "../../domain/layout/work-entry";
import {
  isWhole,
  progressOf,
  type WorkLine,
  type WorkListId,
  type WorkState,
  whyNotYet,
} from "../../domain/layout/work-list";
import type { WorkForm } from "../../validation/layout-work";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { advanceStages } from "./advance-stages.server";
import { figuresUnder } from "./layout-work-state";
import { showPieces } from "./show-pieces.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";
import { whyNoWeld } from "./weld-skill.server";

const { stages, workItems } = schema;

/** The stages that a whole list finishes, and the one that its first line begins. A torqued spring is a fitted one. */
const STAGES: Record<WorkListId, { done: StageKind[]; begun: StageKind | null }> = {
  weld: { done: ["weld"], begun: "weld" },
  torque: { done: ["fit", "torque"], begun: "torque" },
  finish: { done: ["road-test"], begun: "road-test" },
};

/**
 * A person signs a line of the weld, torque or finish list, as good or as not. Never edited: the newest signature of a
 * line counts, so that one is taken back by another. A whole list finishes its stage.
 * @throws Refusal conflict when the step is shut, another line comes first or the weld skill is missing; invalid with
 *   words beside the field
 */
export async function signWork(
  ctx: Context,
  layoutId: number,
  { line, entry, due }: WorkForm,
): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { head, shop, work } = await openStep(tx, ctx, layoutId, line.step);
    await guardWelder(tx, ctx, actor, line);
    const early = entry.state === "pass" ? whyNotYet(line, work.states) : null;
    if (early) throw new Refusal("conflict", early);
    const faults = entryFaults(line, entry);
    const dueAt = due && endOfDay(due, shop.timeZone);
    if (dueAt && dueAt < ctx.now()) faults.due ??= "That day has gone: when is it torqued again?";
    const [first] = Object.values(faults);
    if (first) throw new Refusal("invalid", first, faults);
    const before = work.items.filter(({ item }) => item.item === line.id).at(-1) ?? null;
    if (before && isSame(before, work.items, actor.personId, entry)) return { words: "Signed already." };

    // One moment for the line and its figures: that is how they are found together again.
    const signedAt = ctx.now();
    await tx.insert(workItems).values(
      rowsOf(line, entry).map((row, position) => ({
        ...row,
        shopId: actor.shopId,
        layoutId,
        step: line.step,
        state: entry.state,
        dueAt: line.kind === "bolt" && entry.state === "pass" ? dueAt : null,
        signedBy: actor.personId,
        deviceId: actor.deviceId,
        signedAt,
        position,
      })),
    );
    const after = new Map<string, WorkState>([...work.states, [line.id, entry.state]]);
    await keepStages(tx, ctx, head.build.id, line.list, {
      was: work.work[line.list],
      now: progressOf(line.list, after),
    });
    const words = `${line.label}: ${entry.state === "pass" ? signedWords(line, entry) : `not good, ${entry.words}`}`;
    note({
      verb: entry.state === "pass" ? "sign-work" : "fail-work",
      subject: { kind: "layout", id: layoutId },
      words,
      before: before ? { item: line.id, state: before.item.state } : null,
      after: { item: line.id, state: entry.state },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words };
  });
}

/** A day ends when it ends in the shop. */
const endOfDay = ({ year, month, day }: NonNullable<WorkForm["due"]>, timeZone: string): Date =>
  new Date(new TZDate(year, month - 1, day, 23, 59, timeZone).getTime());

async function guardWelder(tx: Tx, ctx: Context, actor: PersonActor, line: WorkLine): Promise<void> {
  if (line.list !== "weld") return;
  const why = await whyNoWeld(tx, actor, ctx.now());
  if (why) throw new Refusal("conflict", why);
}

/** The line itself, and one row for each alignment figure that was typed. */
const rowsOf = (line: WorkLine, { wanted, read, tool, words, figures }: WorkEntry) => [
  { item: line.id, wantedTyped: wanted, readTyped: read, tool, words },
  ...(line.kind === "figures"
    ? figures.map(({ id, typed }) => ({
        item: `${line.id}.${id}`,
        wantedTyped: "",
        readTyped: typed,
        tool: "",
        words: "",
      }))
    : []),
];

const isSame = (
  { item }: WorkItemRow,
  items: readonly WorkItemRow[],
  personId: number,
  entry: WorkEntry,
): boolean =>
  item.signedBy === personId &&
  item.state === entry.state &&
  item.wantedTyped === entry.wanted &&
  item.readTyped === entry.read &&
  item.tool === entry.tool &&
  item.words === entry.words &&
  JSON.stringify(figuresUnder(items, item)) === JSON.stringify(entry.figures);

function signedWords(line: WorkLine, { wanted, read, figures }: WorkEntry): string {
  if (line.kind === "bolt") return `${read} of ${wanted}`;
  if (line.kind === "weld") return "welded";
  const typed = figures.map(({ id, typed }) => `${id.replace("-", " ")} ${typed}`).join(", ");
  return typed || "good";
}

/** Keeps the list's stage in step: begun with its first line, finished with its last, open again when one is taken back. */
async function keepStages(
  tx: Tx,
  ctx: Context,
  buildId: number,
  list: WorkListId,
  { was, now }: { was: ReturnType<typeof progressOf>; now: ReturnType<typeof progressOf> },
): Promise<void> {
  const { done, begun } = STAGES[list];
  if (list === "weld") await showPieces(tx, buildId, now);
  if (isWhole(now)) await advanceStages(tx, buildId, ctx.now(), { done, begun: null });
  else if (isWhole(was) && begun)
    await tx
      .update(stages)
      .set({ state: "under-way", finishedAt: null })
      .where(and(eq(stages.buildId, buildId), eq(stages.kind, begun)));
  else await advanceStages(tx, buildId, ctx.now(), { done: [], begun });
}
