import type { Db } from "../../app/db/client.server";
import type { StageKind } from "../../app/domain/builds/stages";
import { makeStint } from "./factories";

/** Days from today, hour and minute of the shop's clock. */
type Moment = [day: number, hour: number, minute?: number];

type Plan = {
  db: Db;
  shopId: number;
  at: (day: number, hour: number, minute?: number) => Date;
  bayId: (number: number) => number;
  id: (key: string) => number;
  stage: (key: string, kind: StageKind) => number | undefined;
};

/** A week of stints, two days back and four ahead. */
export async function planWeek({ db, shopId, at, bayId, id, stage }: Plan): Promise<void> {
  const week: readonly [string, StageKind, number, Moment, Moment, string[]][] = [
    ["biscuit", "level", 1, [-2, 7], [-2, 9], ["mina"]],
    ["biscuit", "layout", 1, [-2, 9], [-2, 14], ["mina"]],
    ["biscuit", "mock-up", 1, [0, 7], [0, 12], ["mina"]],
    ["biscuit", "tack", 1, [0, 13], [0, 16], ["mina"]],
    ["pelican", "fit", 2, [-1, 8], [-1, 15], ["june"]],
    ["pelican", "torque", 2, [0, 8], [0, 11], ["june"]],
    ["gravy", "fit", 3, [1, 8], [1, 12], ["cato"]],
    ["gravy", "torque", 3, [1, 13], [1, 15], ["june"]],
    ["mule", "level", 5, [0, 7], [0, 8, 30], ["wes"]],
    ["mule", "layout", 5, [0, 8, 30], [0, 13], ["wes", "pilar"]],
    ["mule", "mock-up", 5, [1, 7], [1, 13], ["wes", "pilar"]],
    ["mule", "tack", 5, [1, 13], [1, 16], ["wes"]],
    ["mule", "weld", 6, [2, 12], [2, 17], ["bram"]],
    ["hatchet", "weld", 6, [0, 8], [0, 17], ["bram", "cato"]],
    ["hatchet", "torque", 2, [2, 7], [2, 11], ["june"]],
    ["sunday", "mock-up", 7, [2, 8], [2, 12], ["otis"]],
    ["copper", "hand-over", 8, [0, 15], [0, 16], []],
    ["dusty", "level", 1, [2, 7], [2, 9], ["mina"]],
    ["dusty", "layout", 1, [2, 9], [2, 15], ["mina"]],
    ["moth", "strip", 4, [1, 7], [1, 10], ["otis"]],
    ["plow", "strip", 4, [3, 7], [3, 10], ["sam"]],
  ];
  for (const [key, kind, number, from, to, crew] of week) {
    const stageId = stage(key, kind);
    if (stageId === undefined) throw new Error(`${key} has no stage ${kind}`);
    await makeStint(db, shopId, {
      stageId,
      bayId: bayId(number),
      startsAt: at(...from),
      endsAt: at(...to),
      crew: crew.map(id),
    });
  }
}
