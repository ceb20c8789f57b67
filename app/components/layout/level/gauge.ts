import { type GaugeLevel, type GaugePlace, gaugeSlope, levelFromAngles } from "../../../domain/layout/level";
import { type Degrees, degrees } from "../../../domain/units/angle";
import type { Draft } from "../use-draft";

export const GAUGE_PLACES: readonly { id: GaugePlace; label: string; plus: string }[] = [
  { id: "leftRail", label: "Left rail", plus: "nose up is plus" },
  { id: "rightRail", label: "Right rail", plus: "nose up is plus" },
  { id: "frontCross", label: "Front cross-member", plus: "right side up is plus" },
  { id: "rearCross", label: "Rear cross-member", plus: "right side up is plus" },
];

/** An angle as a gauge shows it: "0.4", "-1,2", "0.4°"; null while it cannot be read. Steeper than 45° is a slip. */
export function angleIn(typed: string | undefined): Degrees | null {
  const text = (typed ?? "").trim().replace(/[−–]/g, "-").replace(",", ".").replace(/\s*°$/, "");
  if (!/^[+-]?(\d+(\.\d*)?|\.\d+)$/.test(text)) return null;
  const value = Number(text);
  return Math.abs(value) <= 45 ? degrees(value) : null;
}

/** The slope at one place, once it was read both ways round. */
export function slopeAt(place: GaugePlace, draft: Draft): Degrees | null {
  const [first, turned] = [angleIn(draft[`first.${place}`]), angleIn(draft[`turned.${place}`])];
  return first === null || turned === null ? null : gaugeSlope(first, turned).slope;
}

/** The level by what is typed now; null until all four places were read both ways round. */
export function gaugeNow(draft: Draft): GaugeLevel | null {
  const at = (place: GaugePlace) => {
    const [first, turned] = [angleIn(draft[`first.${place}`]), angleIn(draft[`turned.${place}`])];
    return first === null || turned === null ? null : { first, turned };
  };
  const [leftRail, rightRail, frontCross, rearCross] = [
    at("leftRail"),
    at("rightRail"),
    at("frontCross"),
    at("rearCross"),
  ];
  return leftRail && rightRail && frontCross && rearCross
    ? levelFromAngles({ leftRail, rightRail, frontCross, rearCross })
    : null;
}

/** The fields as they are posted. */
export function postedGauge(draft: Draft): Draft {
  const fields: Draft = { method: "gauge" };
  for (const { id } of GAUGE_PLACES)
    for (const way of ["first", "turned"] as const)
      fields[`${way}.${id}`] = draft[`${way}.${id}`]?.trim() ?? "";
  return fields;
}
