import { STAGE_LABEL, type StageKind } from "../../domain/builds/stages";
import type { BoardStage, BoardVehicle } from "../../domain/floor/board";
import { ProgressTape } from "../../ui/progress-tape";
import { Sign, type SignName } from "../../ui/sign";
import { whenInWords } from "../time";
import { useFloorView } from "./floor-context";
import { levelWords } from "./words";

const STAGE_SIGN: Partial<Record<StageKind, SignName>> = {
  level: "level",
  layout: "drop",
  approval: "approve",
  "mock-up": "shackle",
  tack: "tacked",
  weld: "welded",
  fit: "spring-arched",
  torque: "torque",
  "hand-over": "approve",
};
export const stageSign = (kind: StageKind): SignName => STAGE_SIGN[kind] ?? "vehicle";

const piecesWords = ({ pieces }: BoardStage) =>
  pieces ? `${pieces.done} of ${pieces.of} ${pieces.word}` : "";

/** What is being done, how far, and what stands in its way. */
export function StageRow({ vehicle, quiet = false }: { vehicle: BoardVehicle; quiet?: boolean }) {
  const { stage } = vehicle;
  if (!stage)
    return (
      <div className="bay-row">
        <Sign name="approve" size={16} />
        <b>All stages done</b>
      </div>
    );
  return (
    <div className="bay-row">
      <Sign name={stageSign(stage.kind)} size={16} />
      <b>{STAGE_LABEL[stage.kind]}</b>
      <span className="cut">
        {stage.state === "open" && !stage.pieces ? "not begun" : piecesWords(stage)}
      </span>
      {stage.pieces && !quiet ? (
        <ProgressTape of={stage.pieces.of} done={stage.pieces.done} width={66} />
      ) : null}
    </div>
  );
}

/** The hold plate with its reason, or the level with its age. */
export function StateRow({ vehicle }: { vehicle: BoardVehicle }) {
  const { now, timeZone } = useFloorView();
  const { hold } = vehicle;
  const level = levelWords(vehicle.level, now);
  if (!hold && !level) return null;
  return (
    <div className="bay-row bay-row-2">
      {hold ? (
        <span className="hold-plate" data-soft={hold.kind === "customer"}>
          <Sign name="hold" size={16} />
          Hold
        </span>
      ) : null}
      {hold && hold.kind !== "level-void" ? (
        <span
          className={`cut font-medium ${hold.kind === "customer" ? "text-brass-ink" : "text-oxide"}`}
          title={hold.words}
        >
          {hold.words}
          {hold.dueAt ? `, due ${whenInWords(hold.dueAt, now, timeZone)}` : ""}
        </span>
      ) : level ? (
        <LevelWords vehicle={vehicle} words={level} />
      ) : (
        <span className="cut font-medium text-oxide">{hold?.words}</span>
      )}
    </div>
  );
}

function LevelWords({ vehicle, words }: { vehicle: BoardVehicle; words: string }) {
  const { state } = vehicle.level;
  const sign = state === "true" ? "level" : state === "void" ? "void" : "not-level";
  return (
    <span
      className={`flex min-w-0 items-center gap-1.5 font-medium ${state === "true" ? "text-moss" : "text-oxide"}`}
      title={words}
    >
      <Sign name={sign} size={16} />
      <span className="cut">{words}</span>
    </span>
  );
}

/** When the stage in hand should end by the plan, held against what was promised. */
export function PlannedEnd({ vehicle }: { vehicle: BoardVehicle }) {
  const { now, timeZone } = useFloorView();
  const { endsAt, promisedAt } = vehicle;
  if (!endsAt && !promisedAt) return null;
  const late = promisedAt !== null && (promisedAt < now || (endsAt !== null && endsAt > promisedAt));
  const end = endsAt ? `${endsAt < now ? "was due" : "till"} ${whenInWords(endsAt, now, timeZone)}` : null;
  const promise = promisedAt ? `promised ${whenInWords(promisedAt, now, timeZone)}` : null;
  return (
    <span
      className={`bay-end ${late ? "font-semibold text-oxide" : endsAt && endsAt < now ? "text-brass-ink" : ""}`}
    >
      {late ? <Sign name="promise" title="Late" size={16} /> : null}{" "}
      {[end, promise].filter(Boolean).join(" · ")}
    </span>
  );
}
