import type { Db } from "../../app/db/client.server";

export type DemoLayoutsInput = {
  db: Db;
  shopId: number;
  now: Date;
  id: (person: string) => number;
  build: (vehicle: string) => number;
  bayId: (number: number) => number;
};

/** Layouts of the demo shop, made by the shop's own services. */
export async function demoLayouts(_input: DemoLayoutsInput): Promise<void> {}
