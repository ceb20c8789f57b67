import type { DropRow } from "../../db/queries/layouts.server";
import type { ShopSettings } from "../../db/queries/shop.server";
import { floorPoint } from "../../domain/geometry/point";
import type { AxleMethod } from "../../domain/layout/axle-line";
import {
  AXLE_DROPS,
  type AxleDrop,
  type AxleDrops,
  axleUncertainty,
} from "../../domain/layout/axle-uncertainty";
import { bobShifts, offsetShifts, type Shift, tieShifts } from "../../domain/layout/drop-shifts";
import { type DropPointId, type DropSide, dropPoint, pointFromTies } from "../../domain/layout/drops";
import type { AxleSureness } from "../../domain/layout/view";
import { type Millimetres, mm } from "../../domain/units/length";

const WHERE: Record<AxleDrop, [DropPointId, DropSide]> = {
  datumFrontLeft: ["datum-front", "left"],
  datumFrontRight: ["datum-front", "right"],
  datumRearLeft: ["datum-rear", "left"],
  datumRearRight: ["datum-rear", "right"],
  openingFrontLeft: ["opening-front", "left"],
  openingFrontRight: ["opening-front", "right"],
  openingRearLeft: ["opening-rear", "left"],
  openingRearRight: ["opening-rear", "right"],
};

type Mark = { label: string; x: Millimetres; y: Millimetres };
type Input = {
  rows: readonly DropRow[];
  stands: (row: DropRow) => boolean;
  marks: readonly Mark[];
  shop: Pick<ShopSettings, "tapeSigmaMm" | "dropSigmaMm" | "unit">;
  method: AxleMethod;
  asked: Millimetres;
};

/** How sure the axle line is and what makes it so, from the readings that stand; null while one is missing. */
export function axleSureness({ rows, stands, marks, shop, method, asked }: Input): AxleSureness | null {
  const drops: Partial<AxleDrops> = {};
  for (const drop of AXLE_DROPS) {
    const [point, side] = WHERE[drop];
    const row = rows.find(
      (one) =>
        one.drop.point === point &&
        one.drop.side === side &&
        one.reading.supersededAt === null &&
        stands(one),
    );
    if (!row) return null;
    const name = `${(dropPoint(point)?.label ?? point).toLowerCase()}, ${side}`;
    drops[drop] = {
      name,
      point: floorPoint(row.reading.xMm, row.reading.yMm),
      shifts: [...measuredShifts(row, name, marks, shop), ...bobShifts(name, mm(shop.dropSigmaMm))],
    };
  }
  const came = axleUncertainty(drops as AxleDrops, method, asked);
  return came.ok ? { plusMinus: came.value.stationExpanded, words: came.value.words } : null;
}

function measuredShifts(
  row: DropRow,
  name: string,
  marks: readonly Mark[],
  { tapeSigmaMm, unit }: Input["shop"],
): Shift[] {
  const sigma = mm(tapeSigmaMm);
  const { side } = row.drop;
  if (row.reading.method === "ties" && side !== "centre") {
    const ties = row.ties.flatMap((tie) => {
      const mark = marks.find((one) => one.label === tie.mark);
      return mark ? [{ mark: tie.mark, at: floorPoint(mark.x, mark.y), distance: mm(tie.distanceMm) }] : [];
    });
    const fit = pointFromTies(ties, side, sigma, unit);
    if (fit.ok) return tieShifts(name, ties, fit.value, sigma);
  }
  return offsetShifts(name, sigma, sigma);
}
