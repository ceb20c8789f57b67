import { TZDate } from "@date-fns/tz";
import { addDays, addHours, addMinutes, startOfDay } from "date-fns";
import { hashPassword } from "../../app/auth/authenticator.server";
import { type Db, schema } from "../../app/db/client.server";
import { BUILD_TEMPLATES, type BuildTemplateId, type StageKind } from "../../app/domain/builds/stages";
import type { Role, Skill } from "../../app/domain/people/roles";
import { demoHistory } from "./demo-history";
import { demoLayouts } from "./demo-layouts";
import { planWeek } from "./demo-week";
import {
  type MadeBuild,
  makeBay,
  makeBuild,
  makeHanger,
  makePerson,
  makeShop,
  makeSpring,
  putOn,
} from "./factories";
import { workingTimeBefore } from "./working-time";

/*
 * The demo shop: made up from the ground to the people, and marked as demo on every screen. Vehicles by kind and
 * nickname, springs by dimensions. Its day is laid around the moment it is made, so that it looks alive.
 */

/** Somewhere it is mid-morning when the demo is made: a demo shop at midnight would look dead. */
const ZONES = [
  "Pacific/Auckland",
  "Australia/Brisbane",
  "Asia/Tokyo",
  "Asia/Bangkok",
  "Asia/Karachi",
  "Asia/Dubai",
  "Europe/Athens",
  "Europe/London",
  "Atlantic/Azores",
  "America/Sao_Paulo",
  "America/New_York",
  "America/Denver",
  "America/Los_Angeles",
  "Pacific/Honolulu",
];
/** Two marks on the centre line are enough to measure by offsets. */
const LINE_MARKS: Record<string, [number, number]> = { A: [0, 0], B: [120, 0] };

const MID_MORNING = 10.5;

/** The zone of the list in which it is nearest to mid-morning. */
export function demoZone(now: Date): string {
  const off = (zone: string) => {
    const there = new TZDate(now.getTime(), zone);
    const away = Math.abs(there.getHours() + there.getMinutes() / 60 - MID_MORNING);
    return Math.min(away, 24 - away);
  };
  return ZONES.reduce((best, zone) => (off(zone) < off(best) ? zone : best));
}

const PEOPLE: readonly { key: string; name: string; role: Role; skills?: readonly Skill[] }[] = [
  { key: "nell", name: "Nell Varga", role: "owner" },
  { key: "ida", name: "Ida Kestrel", role: "foreman" },
  { key: "rosa", name: "Rosa Quill", role: "counter" },
  { key: "wes", name: "Wes Tolliver", role: "tech", skills: ["strip", "level", "layout", "fabricate"] },
  { key: "pilar", name: "Pilar Dunmore", role: "tech", skills: ["level", "layout", "fabricate", "torque"] },
  { key: "bram", name: "Bram Oduya", role: "tech", skills: ["weld", "fabricate"] },
  { key: "cato", name: "Cato Reyes", role: "tech", skills: ["weld", "fabricate", "strip"] },
  { key: "june", name: "June Halvorsen", role: "tech", skills: ["torque", "brakes", "strip"] },
  { key: "mina", name: "Mina Fairweather", role: "tech", skills: ["level", "fabricate", "strip"] },
  { key: "otis", name: "Otis Lindqvist", role: "tech", skills: ["strip", "fabricate", "torque"] },
  { key: "sam", name: "Sam Achterberg", role: "tech", skills: ["strip", "weld"] },
];

export type SignIn = { role: Role; name: string; email: string };

/** When the stages before one were finished, each taking its hours of open shop, the last of them at `since`. */
function finishTimes(template: BuildTemplateId, at: StageKind, since: Date, zone: string): Date[] {
  const { stages } = BUILD_TEMPLATES[template];
  const done = stages.slice(
    0,
    stages.findIndex((stage) => stage.kind === at),
  );
  const times: Date[] = [];
  let end = since;
  for (const stage of done.toReversed()) {
    times.unshift(end);
    end = workingTimeBefore(end, stage.hours * 60, zone);
  }
  return times;
}

/** Fills an empty database. @returns who can sign in, all with the password given */
export async function makeDemoShop(
  db: Db,
  password: string,
  now = new Date(),
): Promise<{ shop: string; signIns: SignIn[] }> {
  const name = "Juniper Flat Chassis";
  const zone = demoZone(now);
  const shopId = await makeShop(db, {
    name,
    isDemo: true,
    timeZone: zone,
    now,
    lengthFt: 89.7,
    widthFt: 52.6,
  });
  const today = startOfDay(new TZDate(now.getTime(), zone));
  /** A time of the shop's day, some days from today. */
  const at = (day: number, hour: number, minute = 0) =>
    new Date(addMinutes(addHours(addDays(today, day), hour), minute).getTime());
  /** So many minutes of open shop ago. */
  const ago = (minutes: number) => workingTimeBefore(now, minutes, zone);

  const passwordHash = await hashPassword(password);
  const who: Record<string, number> = {};
  const signIns: SignIn[] = [];
  for (const person of PEOPLE) {
    const email = `${person.key}@juniper-flat.example`;
    who[person.key] = await makePerson(db, shopId, {
      ...person,
      email,
      passwordHash,
      ...(person.key === "sam" ? { awayUntil: at(2, 7) } : {}),
    });
    if (["nell", "ida", "rosa", "wes"].includes(person.key))
      signIns.push({ role: person.role, name: person.name, email });
  }
  const id = (key: string) => {
    const found = who[key];
    if (found === undefined) throw new Error(`Nobody is called ${key}`);
    return found;
  };

  const bay: Record<number, number> = {};
  const bays = [
    { number: 1, kind: "level-pad", xFt: 0.54, yFt: 0.54, lengthFt: 28, widthFt: 14, mouth: "east" },
    { number: 2, kind: "lift", xFt: 4.54, yFt: 15.08, lengthFt: 24, widthFt: 12, mouth: "east" },
    { number: 3, kind: "lift", xFt: 4.54, yFt: 27.6, lengthFt: 24, widthFt: 12, mouth: "east" },
    { number: 4, kind: "general", xFt: 10.54, yFt: 40.15, lengthFt: 18, widthFt: 12, mouth: "east" },
    { number: 5, kind: "level-pad", xFt: 57.7, yFt: 0.54, lengthFt: 32, widthFt: 18, mouth: "west" },
    {
      number: 6,
      kind: "weld",
      xFt: 57.7,
      yFt: 19.08,
      lengthFt: 28,
      widthFt: 17.3,
      mouth: "west",
      rated: true,
      marks: LINE_MARKS,
    },
    {
      number: 7,
      kind: "general",
      xFt: 57.7,
      yFt: 36.9,
      lengthFt: 26,
      widthFt: 15,
      mouth: "west",
      rated: true,
      marks: LINE_MARKS,
    },
    {
      number: 8,
      kind: "apron",
      xFt: 0,
      yFt: 54.5,
      lengthFt: 22.5,
      widthFt: 11.4,
      mouth: "east",
      outside: true,
    },
  ] as const;
  for (const row of bays) bay[row.number] = await makeBay(db, shopId, row);
  const bayId = (number: number) => {
    const found = bay[number];
    if (found === undefined) throw new Error(`There is no Bay ${number}`);
    return found;
  };

  const springs = [
    { rackNumber: 14, lengthIn: 52, frontHalfIn: 26, leaves: 5, note: "flat pack, bushings new" },
    { rackNumber: 22, lengthIn: 52, frontHalfIn: 24, leaves: 4, note: "pin ahead, long rear half" },
    { rackNumber: 23, lengthIn: 48, frontHalfIn: 23, leaves: 6 },
    { rackNumber: 31, lengthIn: 56, frontHalfIn: 28, leaves: 5 },
    { rackNumber: 35, lengthIn: 44.5, frontHalfIn: 21.5, leaves: 7, widthIn: 2.25 },
  ];
  const rack = new Map<number, number>();
  for (const spring of springs) rack.set(spring.rackNumber, await makeSpring(db, shopId, spring));
  const { holes } = await makeHanger(db, shopId, "Three-hole front hanger", [0, 1, 2]);

  const by = id("rosa");
  const tyre = { words: "35 × 12.5", loadedRadius: "16.5", radius: "17.5", width: "12.5" };
  const build = ({ since, ...b }: Omit<Parameters<typeof makeBuild>[2], "by"> & { since?: Date }) =>
    makeBuild(db, shopId, {
      by,
      ...b,
      ...(since && b.at ? { finishedAt: finishTimes(b.template ?? "front-leaf", b.at, since, zone) } : {}),
    });
  const vehicles: Record<string, MadeBuild> = {
    mule: await build({
      nickname: "Old Mule",
      code: "M3XF",
      kind: "long-bed-pickup",
      lengthIn: 230,
      customer: "R. Castellane",
      wanted: "Front axle ahead for a steeper bank, 35 in tyres, no rub at lock.",
      bookedInAt: at(-8, 9),
      promisedAt: at(3, 15),
      bayId: bayId(5),
      standsSince: at(-1, 15),
      since: ago(41),
      at: "layout",
      tyre,
      wheelbaseIn: 133,
      approachAskedDeg: 40,
    }),
    biscuit: await build({
      nickname: "Biscuit",
      code: "K7RD",
      kind: "short-bed-pickup",
      customer: "T. Abernathy",
      bookedInAt: at(-9, 10),
      promisedAt: at(2, 12),
      bayId: bayId(1),
      standsSince: at(-2, 7),
      since: at(0, 7),
      at: "mock-up",
      tyre,
      wheelbaseIn: 118,
      pieces: { done: 2, of: 4, word: "hangers" },
    }),
    pelican: await build({
      nickname: "Pelican",
      code: "7HTW",
      kind: "two-door-utility",
      customer: "M. Dufrane",
      template: "springs-only",
      bookedInAt: at(-4, 8),
      promisedAt: at(1, 12),
      bayId: bayId(2),
      standsSince: at(-1, 7),
      since: ago(72),
      at: "torque",
      pieces: { done: 14, of: 22, word: "bolts" },
      wanted: "Rear springs and shackles renewed.",
    }),
    gravy: await build({
      nickname: "Gravy Boat",
      code: "9KNC",
      kind: "wagon",
      customer: "L. Okafor",
      template: "springs-only",
      bookedInAt: at(-5, 11),
      promisedAt: at(2, 10),
      bayId: bayId(3),
      standsSince: at(-1, 13),
      since: at(-1, 15),
      at: "fit",
      pieces: { done: 1, of: 5, word: "springs" },
      wanted: "Sagging rear, one leaf cracked.",
    }),
    hatchet: await build({
      nickname: "Hatchet",
      code: "W3GX",
      kind: "bare-chassis",
      customer: "Pine Street Hauling",
      bookedInAt: at(-14, 9),
      promisedAt: at(2, 16, 30),
      bayId: bayId(6),
      standsSince: at(-2, 7),
      since: at(0, 7),
      at: "weld",
      pieces: { done: 4, of: 10, word: "brackets" },
      wanted: "All hangers new on a repaired frame.",
    }),
    sunday: await build({
      nickname: "Sunday",
      code: "6QPM",
      kind: "open-top",
      customer: "E. Marchetti",
      bookedInAt: at(-6, 9),
      promisedAt: at(6, 12),
      bayId: bayId(7),
      standsSince: at(-1, 9),
      since: ago(142),
      at: "approval",
      tyre,
      wheelbaseIn: 93.5,
    }),
    copper: await build({
      nickname: "Copper",
      code: "T6WR",
      kind: "flatbed",
      customer: "J. Whitlock",
      bookedInAt: at(-15, 9),
      promisedAt: at(0, 15, 30),
      bayId: bayId(8),
      standsSince: ago(200),
      since: ago(200),
      at: "hand-over",
      tyre,
      wheelbaseIn: 140,
    }),
    dusty: await build({
      nickname: "Dusty Anne",
      code: "H4KE",
      kind: "crew-pickup",
      customer: "S. Ibarra",
      bookedInAt: at(-1, 9),
      promisedAt: at(7, 12),
      bayId: null,
      standsSince: at(-1, 9),
      at: "level",
      atState: "open",
      tyre,
      wheelbaseIn: 156,
    }),
    moth: await build({
      nickname: "Moth",
      code: "7CXJ",
      kind: "buggy",
      customer: "Cold Creek Racing",
      bookedInAt: at(-1, 15),
      promisedAt: at(3, 10),
      bayId: null,
      standsSince: at(-1, 15),
      template: "weld-repair",
      wanted: "Link bracket torn off.",
    }),
    plow: await build({
      nickname: "Little Plow",
      code: "R4YA",
      kind: "two-door-utility",
      customer: "D. Finch",
      bookedInAt: ago(90),
      promisedAt: null,
      bayId: null,
      standsSince: ago(90),
      wanted: "Wants the front axle an inch ahead; asks for a price first.",
    }),
  };
  const made = (key: string) => {
    const found = vehicles[key];
    if (!found) throw new Error(`No vehicle ${key}`);
    return found;
  };

  for (const [person, vehicle, minutes] of [
    ["wes", "mule", 116],
    ["pilar", "mule", 50],
    ["bram", "hatchet", 160],
    ["cato", "hatchet", 160],
    ["june", "pelican", 72],
    ["mina", "biscuit", 130],
  ] as const)
    await putOn(db, shopId, id(person), made(vehicle).buildId, ago(minutes));

  const hold = (
    key: string,
    kind: "parts" | "customer" | "level-void",
    words: string,
    minutes: number,
    dueAt: Date | null = null,
  ) =>
    db.insert(schema.holds).values({
      shopId,
      buildId: made(key).buildId,
      kind,
      words,
      dueAt,
      placedBy: id("ida"),
      placedAt: ago(minutes),
    });
  await hold("gravy", "parts", "4 U-bolts short", 300, at(1, 8));
  await hold("sunday", "customer", "Option sent, no answer yet", 142);
  await hold("biscuit", "level-void", "Stand 3 was touched", 44);

  await planWeek({ db, shopId, at, bayId, id, stage: (key, kind) => made(key).stages.get(kind) });
  await demoLayouts({
    db,
    shopId,
    ago,
    id,
    build: (key) => made(key).buildId,
    spring: (rackNumber) => rack.get(rackNumber) ?? 0,
    hole: (number) => holes[number - 1] ?? 0,
  });
  await demoHistory(db, shopId, { booked: id("rosa"), moved: id("ida") });
  return { shop: name, signIns };
}
