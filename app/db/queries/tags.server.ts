import { and, desc, eq, isNull } from "drizzle-orm";
import type { VehicleKind } from "../../domain/builds/vehicle-kinds";
import { type Reader, schema } from "../client.server";

const { builds, layouts, tags, vehicles } = schema;

export type BuildTag = {
  code: string;
  nickname: string;
  kind: VehicleKind;
  vehicleId: number;
  issuedAt: string;
};

/** The tag that hangs on a build's vehicle, with the build; null when the shop has no such build. */
export async function readBuildTag(tx: Reader, shopId: number, buildId: number): Promise<BuildTag | null> {
  const [row] = await tx
    .select({ tag: tags, vehicle: vehicles })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .where(and(eq(builds.id, buildId), eq(builds.shopId, shopId)));
  if (!row) return null;
  return {
    code: row.tag.code,
    nickname: row.vehicle.nickname,
    kind: row.vehicle.kind,
    vehicleId: row.vehicle.id,
    issuedAt: row.tag.issuedAt.toISOString(),
  };
}

export type TagLookup =
  | { state: "unknown" }
  /** Another tag hangs on that vehicle now. */
  | { state: "replaced"; nickname: string; replacedAt: string }
  /** The vehicle is known, but no build of it is here. */
  | { state: "gone"; nickname: string }
  | { state: "here"; nickname: string; buildId: number; layoutId: number | null };

/** Where a tag leads: the newest build of its vehicle that is here, and that build's newest layout. */
export async function lookUpTag(tx: Reader, shopId: number, code: string): Promise<TagLookup> {
  const [found] = await tx
    .select({ tag: tags, nickname: vehicles.nickname })
    .from(tags)
    .innerJoin(vehicles, eq(vehicles.id, tags.vehicleId))
    .where(and(eq(tags.shopId, shopId), eq(tags.code, code)));
  if (!found) return { state: "unknown" };
  const { tag, nickname } = found;
  if (tag.replacedAt) return { state: "replaced", nickname, replacedAt: tag.replacedAt.toISOString() };
  const [build] = await tx
    .select({ id: builds.id })
    .from(builds)
    .where(and(eq(builds.vehicleId, tag.vehicleId), eq(builds.state, "here")))
    .orderBy(desc(builds.bookedInAt), desc(builds.id))
    .limit(1);
  if (!build) return { state: "gone", nickname };
  const [layout] = await tx
    .select({ id: layouts.id })
    .from(layouts)
    .where(eq(layouts.buildId, build.id))
    .orderBy(desc(layouts.id))
    .limit(1);
  return { state: "here", nickname, buildId: build.id, layoutId: layout?.id ?? null };
}
