import type { VehicleKind } from "../../domain/builds/vehicle-kinds";
import type { BoardBay, BoardVehicle } from "../../domain/floor/board";
import type { LengthUnit } from "../../domain/units/length";
import type { Asked } from "./asked-for";
import type { StageRow } from "./stage-line";
import type { StoryRow } from "./story";

/** What the page of a build is handed. */
export type BuildPageProps = {
  build: {
    id: number;
    state: "here" | "gone";
    wanted: string;
    nickname: string;
    code: string;
    kind: VehicleKind;
    lengthMm: number;
    widthMm: number;
    asked: Asked;
    promisedAt: string | null;
    bookedInAt: string;
    bookedInBy: string;
    leftAt: string | null;
  };
  /** Null: not for this role. */
  customer: { name: string; phone: string; email: string } | null;
  stages: StageRow[];
  holds: {
    id: number;
    words: string;
    kind: string;
    placedBy: string;
    placedAt: string;
    dueAt: string | null;
  }[];
  /** Null: it stands nowhere any more. */
  standing: BoardVehicle | null;
  bay: BoardBay | null;
  story: StoryRow[];
  mayPrint: boolean;
  mayChange: boolean;
  mayMeasure: boolean;
  now: string;
  timeZone: string;
  unit: LengthUnit;
};
