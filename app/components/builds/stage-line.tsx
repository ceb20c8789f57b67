import { STAGE_LABEL, type StageKind, type StageState } from "../../domain/builds/stages";
import { Sign } from "../../ui/sign";
import { stageSign } from "../floor/bay-rows";
import { whenInWords } from "../time";

export type StageRow = {
  id: number;
  kind: StageKind;
  state: StageState;
  hours: number;
  heads: number;
  stay: string | null;
  pieces: { done: number; of: number; word: string } | null;
  startedAt: string | null;
  finishedAt: string | null;
};

type Crew = readonly { personId: number; name: string }[];

/** The stages down a plumb line; the bob hangs at the one in hand, or at the next when none is. */
export function StageLine({
  stages,
  crew,
  now,
  timeZone,
}: {
  stages: readonly StageRow[];
  crew: Crew;
  now: string;
  timeZone: string;
}) {
  if (stages.length === 0) return <p className="text-concrete-700">This build has no stages.</p>;
  const inHand =
    stages.find((stage) => stage.state === "under-way") ?? stages.find((stage) => stage.state === "open");
  return (
    <ol className="grid">
      {stages.map((stage, index) => (
        <li
          key={stage.id}
          className="grid min-h-11 grid-cols-[2.25rem_1.75rem_minmax(0,1fr)_auto] items-center gap-x-2"
        >
          <LinePart place={placeOf(stage, inHand)} first={index === 0} last={index === stages.length - 1} />
          <span className={stage.state === "open" && stage !== inHand ? "text-concrete-500" : ""}>
            <Sign name={stageSign(stage.kind)} size={20} />
          </span>
          <p className="min-w-0 py-1">
            <span
              className={
                stage === inHand ? "font-semibold text-xl" : stage.state === "open" ? "text-concrete-700" : ""
              }
            >
              {STAGE_LABEL[stage.kind]}
            </span>{" "}
            <span className={stage === inHand ? "font-medium text-brass-ink" : "text-concrete-500"}>
              {stateWords(stage, stage === inHand ? crew : [], now, timeZone)}
            </span>
          </p>
          <p className="text-right text-concrete-700">
            {stage.hours} h{stage.heads > 1 ? ` × ${stage.heads}` : ""}
            {stays(stages, index)}
          </p>
        </li>
      ))}
    </ol>
  );
}

type Place = "done" | "in-hand" | "ahead";
const placeOf = (stage: StageRow, inHand: StageRow | undefined): Place =>
  stage === inHand ? "in-hand" : stage.state === "done" ? "done" : "ahead";

function stateWords(stage: StageRow, crew: Crew, now: string, timeZone: string): string {
  if (stage.state === "done")
    return stage.finishedAt ? `done ${whenInWords(stage.finishedAt, now, timeZone)}` : "done";
  if (stage.state === "open") return stage.pieces ? piecesWords(stage) : "";
  const who = crew.map((person) => person.name.split(" ")[0]).join(" and ");
  const since = stage.startedAt ? `since ${whenInWords(stage.startedAt, now, timeZone)}` : "under way";
  return [piecesWords(stage), since, who].filter(Boolean).join(", ");
}

const piecesWords = ({ pieces }: StageRow) => (pieces ? `${pieces.done} of ${pieces.of} ${pieces.word}` : "");

/** Said where an unbroken stay begins: from there on the vehicle is not moved. */
function stays(stages: readonly StageRow[], index: number) {
  const stay = stages[index]?.stay;
  if (!stay || stages[index - 1]?.stay === stay) return null;
  const length = stages.filter((stage) => stage.stay === stay).length;
  return length > 1 ? (
    <span className="block text-[13px] text-concrete-500">one stay, {length} stages</span>
  ) : null;
}

/** A piece of the line: solid above and through what is done, the bob at what is in hand, dots ahead. */
function LinePart({ place, first, last }: { place: Place; first: boolean; last: boolean }) {
  const middle = "absolute left-1/2 -translate-x-1/2";
  return (
    <span className="relative self-stretch" aria-hidden="true">
      {first ? null : (
        <span
          className={`${middle} top-0 h-1/2 ${place === "ahead" ? "border-concrete-300 border-l-2 border-dotted" : "w-[2.4px] bg-brass"}`}
        />
      )}
      {last || place === "in-hand" ? null : (
        <span
          className={`${middle} bottom-0 h-1/2 ${place === "ahead" ? "border-concrete-300 border-l-2 border-dotted" : "w-[2.4px] bg-brass"}`}
        />
      )}
      {place === "in-hand" ? (
        <svg
          aria-hidden="true"
          viewBox="0 0 18 34"
          width="18"
          height="34"
          className={`${middle} top-1/2 -translate-y-1/2`}
        >
          <path
            d="M3.5 2h11l2.5 7-8 24L1 9z"
            className="fill-brass stroke-brass-ink"
            strokeWidth="1.6"
            strokeLinejoin="round"
          />
        </svg>
      ) : (
        <span
          className={`${middle} top-1/2 h-[2.4px] w-4 -translate-y-1/2 ${place === "done" ? "bg-brass-ink" : "bg-concrete-300"}`}
        />
      )}
    </span>
  );
}
