import type { Actor } from "~/auth/actor";
import { hashPassword } from "~/auth/authenticator.server";
import type { Db } from "~/db/client.server";
import type { ActorRole, Role } from "~/domain/people/roles";
import type { Context } from "~/services/change.server";
import {
  makeBay,
  makeShop as makeEmptyShop,
  makeHanger,
  makePerson,
  makeSpring,
} from "../../server/seed/factories";

export * from "../../server/seed/factories";

export type TestPerson = {
  personId: number | null;
  shopId: number;
  role: ActorRole;
  name: string;
  email: string;
};

export type TestShop = {
  shopId: number;
  people: Record<"owner" | "foreman" | "foreman2" | "tech" | "tech2" | "welder" | "counter", TestPerson>;
  display: TestPerson;
  /** 1 and 2: level pads; 3: a short general bay (12 ft); 4: lift; 5: weld bay. */
  bays: Record<1 | 2 | 3 | 4 | 5, number>;
  springs: { centred: number; pinAhead: number };
  hangerId: number;
  /** Holes 1, 2, 3. */
  holes: number[];
};

let serial = 0;

/** A shop with people in every role, five bays, two springs and a three-hole hanger. */
export async function makeTestShop(
  db: Db,
  options: { password?: string; timeZone?: string; unit?: "in" | "mm" } = {},
): Promise<TestShop> {
  const mark = `${process.pid}-${Date.now().toString(36)}-${++serial}`;
  const shopId = await makeEmptyShop(db, {
    name: `Test shop ${mark}`,
    timeZone: options.timeZone ?? "Etc/UTC",
    unit: options.unit,
  });
  const passwordHash = options.password === undefined ? undefined : await hashPassword(options.password);
  const person = async (
    name: string,
    role: Role,
    skills: Parameters<typeof makePerson>[2]["skills"] = [],
  ): Promise<TestPerson> => {
    const email = `${name.split(" ")[0]?.toLowerCase()}.${mark}@test.example`;
    const personId = await makePerson(db, shopId, { name, role, skills, email, passwordHash });
    return { shopId, role, name, email, personId };
  };
  const people = {
    owner: await person("Olga Owner", "owner"),
    foreman: await person("Fay Foreman", "foreman"),
    foreman2: await person("Finn Foreman", "foreman"),
    tech: await person("Tess Tech", "tech", ["strip", "level", "layout", "fabricate"]),
    tech2: await person("Tom Tech", "tech", ["strip", "torque"]),
    welder: await person("Wim Welder", "tech", ["weld"]),
    counter: await person("Cora Counter", "counter"),
  };
  const bays = {
    1: await makeBay(db, shopId, { number: 1, kind: "level-pad", yFt: 0.5, lengthFt: 28, widthFt: 14 }),
    2: await makeBay(db, shopId, { number: 2, kind: "level-pad", yFt: 15, lengthFt: 28, widthFt: 14 }),
    3: await makeBay(db, shopId, { number: 3, yFt: 30, lengthFt: 12, widthFt: 12 }),
    4: await makeBay(db, shopId, {
      number: 4,
      kind: "lift",
      xFt: 60,
      yFt: 0.5,
      lengthFt: 24,
      widthFt: 12,
      mouth: "west",
    }),
    5: await makeBay(db, shopId, {
      number: 5,
      kind: "weld",
      xFt: 60,
      yFt: 15,
      lengthFt: 28,
      widthFt: 14,
      mouth: "west",
    }),
  };
  return {
    shopId,
    people,
    display: { shopId, role: "display", name: "Wall", email: "", personId: null },
    bays,
    springs: {
      centred: await makeSpring(db, shopId, { rackNumber: 14, lengthIn: 52, frontHalfIn: 26 }),
      pinAhead: await makeSpring(db, shopId, { rackNumber: 22, lengthIn: 52, frontHalfIn: 24 }),
    },
    ...(await makeHanger(db, shopId, "Three holes, 1 in apart", [0, 1, 2])),
  };
}

/** What a service is handed when this person asks. */
export function contextFor(
  db: Db,
  person: TestPerson,
  over: { now?: () => Date; publish?: (shopId: number) => void } = {},
): Context {
  const actor: Actor = {
    shopId: person.shopId,
    role: person.role,
    personId: person.personId,
    deviceId: null,
    name: person.name,
    initials: person.name
      .split(" ")
      .map((word) => word[0] ?? "")
      .join(""),
    sessionHash: "0".repeat(64),
  };
  return { db, actor, publish: over.publish ?? (() => {}), now: over.now ?? (() => new Date()) };
}
