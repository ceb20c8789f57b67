import { useRef, useState } from "react";
import { cautionFor } from "../../../domain/layout/caution";
import { formatDegrees } from "../../../domain/units/angle";
import { mm } from "../../../domain/units/length";
import { EntryDock } from "../entry-dock";
import { lengthIn, withUnit } from "../lengths";
import { FramePlan } from "./frame-plan";
import { acrossOf, type HeightsNow, nextUnread, type Place } from "./heights";
import { twistWords } from "./level-verdict";
import type { LevelWay } from "./level-way";
import { StandCard } from "./stand-cards";

type Props = LevelWay & { places: readonly Place[]; now: HeightsNow };

/** Heights of the frame at its stands: a card at each, round the plan of the frame. */
export function HeightsWay({ view, places, now, draft, change, fields, readOnly, busy, check, pad }: Props) {
  const { unit } = view;
  const [inHand, setInHand] = useState<string | null>(null);
  const cards = useRef<HTMLDivElement>(null);
  const place = places.find((one) => one.id === inHand) ?? null;
  const next = place ? nextUnread(places, draft, place.id) : null;
  const focusOn = (id: string) =>
    cards.current?.querySelector<HTMLInputElement>(`[name="height.${id}"]`)?.focus();
  const keep = () => {
    if (next) return focusOn(next.id);
    if (!now.missing) check();
  };
  const before = new Map(
    view.level?.readings.map((reading) => [reading.place, reading.height?.typed ?? null]),
  );
  return (
    <>
      <div className="stand-cards" ref={cards}>
        <FramePlan
          stands={planStands(places, draft, unit)}
          inHand={inHand}
          spread={spreadWords(places, draft, unit)}
        />
        {places.map((one) => (
          <StandCard
            key={one.id}
            place={one}
            draft={draft}
            unit={unit}
            inHand={one.id === inHand && !readOnly}
            raise={now.moves.get(one.id)}
            before={before.get(one.id) ?? null}
            padUp={pad.padUp}
            readOnly={readOnly}
            error={fields[`height.${one.id}`]}
            onChange={(value) => change({ [`height.${one.id}`]: value })}
            onKeep={keep}
            onHand={() => setInHand(one.id)}
          />
        ))}
        <AfterWords now={now} unit={unit} />
      </div>
      {place && !readOnly ? (
        <EntryDock
          what={`${place.label} stand`}
          hint={
            before.get(place.id)
              ? `was ${before.get(place.id)}: read it again`
              : "height of the frame over the water level or laser"
          }
          value={draft[`height.${place.id}`] ?? ""}
          onChange={(value) => change({ [`height.${place.id}`]: value })}
          onKeep={keep}
          unit={unit}
          next={next ? `and go to ${next.label}` : "and check the level"}
          caution={cautionFor("level")[0]}
          busy={busy}
          {...pad}
        />
      ) : null}
    </>
  );
}

function AfterWords({ now, unit }: { now: HeightsNow; unit: LevelWay["view"]["unit"] }) {
  const { level, after, moves } = now;
  if (!level || !after) return null;
  const raises = [...moves.values()].some((raise) => raise !== 0);
  const [nose, right] = [formatDegrees(after.noseHigh), formatDegrees(after.rightHigh)];
  const twist = twistWords(level.twist, unit);
  return (
    <p className="stand-after" role="status">
      {raises ? (
        <b className="font-semibold">
          Raised so, it stands{" "}
          {nose === right ? `${nose.replace("−", "")} both ways` : `${nose} along, ${right} across`}.{" "}
        </b>
      ) : null}
      <span className="text-concrete-700">{twist}</span>
    </p>
  );
}

/** The stands as the plan wants them: from their own middle. */
function planStands(places: readonly Place[], draft: LevelWay["draft"], unit: LevelWay["view"]["unit"]) {
  const xs = places.map((place) => lengthIn(draft[`x.${place.id}`], unit));
  const known = xs.filter((x) => x !== null);
  if (known.length < 2) return CORNERS;
  const mid = (Math.max(...known) + Math.min(...known)) / 2;
  return places.map((place, i) => ({
    place: place.id,
    x: minus(xs[i] ?? null, mid),
    y: acrossOf(place, draft, unit),
  }));
}

const minus = (x: number | null, mid: number): number | null => (x === null ? null : x - mid);

/** How the corners lie before anything is known of them. */
const CORNERS = [
  { place: "left-front", x: 54, y: 17 },
  { place: "right-front", x: 54, y: -17 },
  { place: "left-rear", x: -54, y: 17 },
  { place: "right-rear", x: -54, y: -17 },
];

/** "stands 108 in apart, 30 in across"; null while that is not known. */
function spreadWords(
  places: readonly Place[],
  draft: LevelWay["draft"],
  unit: LevelWay["view"]["unit"],
): string | null {
  const xs = places.flatMap((place) => lengthIn(draft[`x.${place.id}`], unit) ?? []);
  const ys = places.flatMap((place) => acrossOf(place, draft, unit) ?? []);
  if (xs.length < 2 || ys.length < 2) return null;
  const spread = (values: number[]) => withUnit(mm(Math.max(...values) - Math.min(...values)), unit);
  return `stands ${spread(xs)} apart, ${spread(ys)} across`;
}
