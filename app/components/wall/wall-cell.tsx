import type { BayCard, BoardBay, BoardVehicle, NextCard } from "../../domain/floor/board";
import { Sign } from "../../ui/sign";
import { Stencil } from "../../ui/stencil";
import { ToolCheck } from "../../ui/tool-check";
import { whenInWords } from "../time";
import { VehicleGlyph } from "../vehicle-plan";
import { endWords, levelLine, PLACE_WORDS, piecesWords, stageWords } from "./wall-words";

/** Letters of the second line that leave room for the vehicle's picture. */
const ROOM_BESIDE_GLYPH = 26;

const secondWords = (vehicle: BoardVehicle, now: number) =>
  (vehicle.hold && vehicle.hold.kind !== "level-void"
    ? vehicle.hold.words
    : levelLine(vehicle, now)?.words) ?? "";

const TONE = { true: "text-moss", stop: "text-oxide", quiet: "text-concrete-500" } as const;

type Props = {
  card: BayCard;
  side: "west" | "east";
  last: boolean;
  /** False: what is known may be old; level, hold, crew and finish are taken down. */
  live: boolean;
  now: number;
  zone: string;
  /** The next stint planned here. */
  next: NextCard | null;
};

export function WallCell({ card, side, last, live, now, zone, next }: Props) {
  const { bay, vehicle } = card;
  return (
    <section
      aria-label={`Bay ${bay.number}`}
      className={`wall-cell ${side} ${last ? "last" : ""} ${live ? "" : "wall-stripes text-concrete-500"}`}
    >
      <div className="wall-number">
        <Stencil
          n={bay.number}
          size="calc(168 * var(--u))"
          cut={[1, 4, 7].includes(bay.number) ? "h" : "v"}
        />
      </div>
      {vehicle ? (
        live ? (
          <LiveLines card={card} now={now} zone={zone} />
        ) : (
          <StaleLines card={card} />
        )
      ) : (
        <EmptyLines next={live ? next : null} live={live} now={now} zone={zone} />
      )}
    </section>
  );
}

function EmptyLines({
  live,
  next,
  now,
  zone,
}: {
  live: boolean;
  next: NextCard | null;
  now: number;
  zone: string;
}) {
  return (
    <>
      <p className="wall-79 font-medium text-concrete-500">{live ? "Empty" : "was empty"}</p>
      {next ? (
        <p className="wall-line second wall-46 text-concrete-500">
          <Sign name="bay" size="calc(46 * var(--u))" />
          Next: {next.nickname}, {whenInWords(next.at, new Date(now), zone)}
        </p>
      ) : null}
    </>
  );
}

function StaleLines({ card }: { card: BayCard }) {
  if (!card.vehicle) return null;
  return (
    <>
      <p className="wall-line key wall-79 font-medium">
        <span>{card.vehicle.nickname}</span>
        <span>was: {stageWords(card.vehicle)}</span>
      </p>
      <p className="wall-line second wall-46 text-oxide">
        <Sign name="stale" size="calc(46 * var(--u))" />
        Level not known: ask at the bay
      </p>
    </>
  );
}

function LiveLines({ card, now, zone }: { card: BayCard; now: number; zone: string }) {
  const { vehicle } = card;
  if (!vehicle) return null;
  const ends = endWords(vehicle, now, zone);
  const { hold } = vehicle;
  return (
    <>
      <p className="wall-line key">
        <b className="wall-79 font-bold">{vehicle.nickname}</b>
        <span className="wall-79 font-medium text-concrete-700">{stageWords(vehicle)}</span>
        <span className="wall-46 ml-auto text-concrete-700">{piecesWords(vehicle)}</span>
      </p>
      <p className="wall-line second wall-46 font-semibold">
        {hold ? (
          <span className={`wall-plate ${hold.kind === "customer" ? "soft" : ""}`}>
            <Sign name="hold" size="calc(46 * var(--u))" />
            Hold
          </span>
        ) : null}
        <SecondLine vehicle={vehicle} bay={card.bay} now={now} />
      </p>
      <p className="wall-line third wall-46">
        {vehicle.crew.length === 0 && !ends ? <span className="text-concrete-500">Nobody on it</span> : null}
        {vehicle.crew.slice(0, 3).map((person) => (
          <ToolCheck
            key={person.personId}
            initials={person.initials}
            state="on"
            size="calc(56 * var(--u))"
            letters={0.66}
            title={person.name}
          />
        ))}
        <span className="wall-line ml-auto">
          {ends ? <span className={ends.late ? "font-semibold text-oxide" : ""}>{ends.words}</span> : null}
          {vehicle.promisedAt ? (
            <>
              <Sign name="promise" size="calc(40 * var(--u))" />
              <span>
                promised{" "}
                <b className="font-semibold">{whenInWords(vehicle.promisedAt, new Date(now), zone)}</b>
              </span>
            </>
          ) : null}
        </span>
      </p>
      {secondWords(vehicle, now).length + (hold ? 8 : 0) > ROOM_BESIDE_GLYPH ? null : (
        <div className="wall-glyph">
          <VehicleGlyph kind={vehicle.kind} />
        </div>
      )}
    </>
  );
}

/** The hold's reason, or the level, or where it stands when no level was taken. */
function SecondLine({ vehicle, bay, now }: { vehicle: BoardVehicle; bay: BoardBay; now: number }) {
  const level = levelLine(vehicle, now);
  const { hold } = vehicle;
  if (hold && (hold.kind !== "level-void" || level?.sign !== "void"))
    return (
      <span className={`wall-cut ${hold.kind === "customer" ? "text-brass-ink" : "text-oxide"}`}>
        {hold.words}
      </span>
    );
  if (level)
    return (
      <span className={`wall-line wall-cut ${TONE[level.tone]}`}>
        <Sign name={level.sign} size="calc(46 * var(--u))" />
        <span className="wall-cut">{level.words}</span>
      </span>
    );
  return (
    <span className="wall-line font-medium text-concrete-500">
      <Sign name="bay" size="calc(46 * var(--u))" />
      {PLACE_WORDS[bay.kind]}
    </span>
  );
}
