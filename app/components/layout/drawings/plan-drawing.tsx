import type { FloorPoint } from "../../../domain/geometry/point";
import { framePoint } from "../../../domain/geometry/point";
import type { DropPointId, DropSide } from "../../../domain/layout/drops";
import { toFloor, toFrame } from "../../../domain/layout/frame";
import type { LayoutView } from "../../../domain/layout/view";
import { formatDegrees } from "../../../domain/units/angle";
import { formatDecimalInches, mm } from "../../../domain/units/length";
import { type Box, type Label, placeLabels } from "./labels";
import { axleEnds, dropLabel, ELLIPSE_DRAWN, ellipseFor, frameBox, optionOf, standing } from "./plan-figures";
import { Dimension, HALO, path, ScaleBar, type To } from "./plan-measures";
import { Tapes } from "./plan-tapes";
import { type Scale, type Size, type Spot, spotAt } from "./viewport";

export type PlanProps = {
  view: LayoutView;
  scale: Scale;
  size: Size;
  inHand: { point: DropPointId; side: DropSide } | null;
  preview: { at: FloorPoint; ties: string[]; suspect: boolean } | null;
  optionKey: string | null;
  compact: boolean;
};

/** The plan itself, at one scale; no state. Also drawn on the layout sheet. */
export function PlanDrawing(props: PlanProps) {
  const { view, scale, size, inHand, preview, optionKey, compact } = props;
  const to = (point: { x: number; y: number }) => spotAt(scale, point);
  return (
    <svg
      width={size.width}
      height={size.height}
      viewBox={`0 0 ${size.width} ${size.height}`}
      className="block select-none"
      aria-hidden="true"
    >
      <Joints {...{ scale, size }} />
      <Openings view={view} to={to} />
      <FrameLines view={view} to={to} />
      <Tyres view={view} to={to} optionKey={optionKey} />
      <AxleLineDrawn view={view} to={to} optionKey={optionKey} />
      <Marks view={view} to={to} />
      <Tapes view={view} to={to} inHand={inHand} preview={preview} />
      <Holes view={view} to={to} optionKey={optionKey} />
      <Drops {...props} to={to} />
      {preview ? <Cross at={to(preview.at)} colour="var(--brass-ink)" width={3} reach={9} ring /> : null}
      <Dimension view={view} to={to} optionKey={optionKey} />
      {compact ? null : <ScaleBar view={view} scale={scale} />}
    </svg>
  );
}

/** Saw-cut joints, four feet apart: the floor's own grid. */
function Joints({ scale, size }: { scale: Scale; size: Size }) {
  const every = 4 * 304.8 * scale.k;
  if (every < 24) return null;
  const lines: string[] = [];
  for (let x = ((scale.ox % every) + every) % every; x < size.width; x += every)
    lines.push(`M${x.toFixed(1)} 0V${size.height}`);
  for (let y = ((scale.oy % every) + every) % every; y < size.height; y += every)
    lines.push(`M0 ${y.toFixed(1)}H${size.width}`);
  return <path d={lines.join("")} stroke="var(--concrete-200)" fill="none" />;
}

function Marks({ view, to }: { view: LayoutView; to: To }) {
  const [a, b] = ["A", "B"].map((label) => view.bay.marks.find((mark) => mark.label === label));
  return (
    <g>
      {a && b ? (
        <>
          <path d={path([to(a), to(b)])} stroke="var(--line)" strokeWidth="5" opacity=".14" />
          <path d={path([to(a), to(b)])} stroke="var(--line)" strokeWidth="1.4" />
        </>
      ) : null}
      {view.bay.marks.map((mark) => {
        const at = to(mark);
        return (
          <g key={mark.label}>
            <circle cx={at.x} cy={at.y} r="5.5" fill="var(--brass)" stroke="var(--ink)" />
            <circle cx={at.x} cy={at.y} r="1.4" fill="var(--ink)" />
            <text
              x={at.x}
              y={at.y + (mark.y < 0 ? 24 : -11)}
              textAnchor="middle"
              fontSize="20"
              fontWeight="700"
              {...HALO}
            >
              {mark.label}
            </text>
          </g>
        );
      })}
    </g>
  );
}

function Openings({ view, to }: { view: LayoutView; to: To }) {
  return (["left", "right"] as const).map((side) => {
    const [front, rear] = [standing(view, "opening-front", side), standing(view, "opening-rear", side)];
    if (!front || !rear) return null;
    // The outer edge is where the lips were dropped; how deep the opening is was not measured, so it stays open inward.
    const inward = (side === "left" ? -1 : 1) * 220;
    const corners = [rear, { x: rear.x, y: rear.y + inward }, { x: front.x, y: front.y + inward }, front];
    return (
      <path
        key={side}
        d={path(corners.map(to))}
        fill="var(--concrete-200)"
        stroke="var(--concrete-500)"
        strokeWidth="1.6"
        strokeLinejoin="round"
      />
    );
  });
}

function FrameLines({ view, to }: { view: LayoutView; to: To }) {
  const rails = (["left", "right"] as const).map((side) => {
    const [front, rear] = [standing(view, "datum-front", side), standing(view, "datum-rear", side)];
    return front && rear ? (
      <path
        key={side}
        d={path([to(rear), to(front)])}
        stroke="var(--concrete-700)"
        strokeWidth="1.3"
        strokeDasharray="7 4"
      />
    ) : null;
  });
  if (!view.frame) return rails;
  const { frame } = view;
  const ahead = standing(view, "datum-front", "left");
  const end = (ahead ? toFrame(frame, ahead).station : 2000) + 180;
  const [from, till] = [to(toFloor(frame, framePoint(-180, 0))), to(toFloor(frame, framePoint(end, 0)))];
  return (
    <g>
      {rails}
      <path d={path([from, till])} stroke="var(--ink)" strokeWidth="1.3" strokeDasharray="16 4 3 4" />
      <text x={from.x + 4} y={from.y + 18} fontSize="15" fontWeight="600" {...HALO}>
        frame centre line, {formatDegrees(frame.angle).replace("−", "")} off A to B
      </text>
    </g>
  );
}

function AxleLineDrawn({ view, to, optionKey }: { view: LayoutView; to: To; optionKey: string | null }) {
  const option = optionOf(view, optionKey);
  const ends = axleEnds(view, option, mm(1000));
  if (!ends || !view.axle) return null;
  const line = path(ends.map(to));
  const top = to(ends[0]);
  const station = option ? option.axleStation : view.axle.line.station;
  const centre = option ? axleEnds(view, null, mm(1000)) : null;
  return (
    <g>
      {centre ? (
        <path d={path(centre.map(to))} stroke="var(--concrete-500)" strokeWidth="1.3" strokeDasharray="2 4" />
      ) : null}
      <path d={line} stroke="var(--line)" strokeWidth="8" opacity=".16" strokeLinecap="round" />
      <path d={line} stroke="var(--line)" strokeWidth="2.2" />
      <text x={top.x + 8} y={top.y + 14} fontSize="16" fontWeight="700" fill="var(--line)" {...HALO}>
        axle line {formatDecimalInches(station)}
      </text>
    </g>
  );
}

function Tyres({ view, to, optionKey }: { view: LayoutView; to: To; optionKey: string | null }) {
  const { tyreRadius, tyreWidth } = view.asked;
  const station = optionOf(view, optionKey)?.axleStation ?? view.axle?.line.station;
  if (!view.frame || !view.openings || !tyreRadius || !tyreWidth || station === undefined) return null;
  return (["left", "right"] as const).map((side) => {
    const opening = view.openings?.[side];
    if (!opening) return null;
    const outer = opening.centre.offset;
    const middle = outer - Math.sign(outer) * (tyreWidth / 2);
    const corners = frameBox(view, mm(station - tyreRadius), mm(station + tyreRadius), middle, tyreWidth / 2);
    return (
      <path
        key={side}
        d={`${path(corners.map(to))}Z`}
        fill="var(--concrete-300)"
        fillOpacity=".35"
        stroke="var(--concrete-500)"
        strokeDasharray="9 4"
        strokeLinejoin="round"
      />
    );
  });
}

function Holes({ view, to, optionKey }: { view: LayoutView; to: To; optionKey: string | null }) {
  const option = optionOf(view, optionKey);
  const sides = (["left", "right"] as const).map((side) => standing(view, "hanger-hole", side));
  if (!view.frame) return null;
  const { frame } = view;
  return sides.map((place, i) => {
    if (!place) return null;
    const { offset } = toFrame(frame, place);
    return (
      <g key={i === 0 ? "left" : "right"}>
        {option ? (
          <path
            d={path([
              to(toFloor(frame, framePoint(option.hole.station, offset))),
              to(toFloor(frame, framePoint(option.axleStation, offset))),
            ])}
            stroke="var(--brass)"
            strokeWidth="5"
            opacity=".55"
            strokeLinecap="round"
          />
        ) : null}
        {view.holes.map((hole) => {
          const at = to(toFloor(frame, framePoint(hole.station, offset)));
          const used = option?.hole.id === hole.id;
          return (
            <circle
              key={hole.id}
              cx={at.x}
              cy={at.y}
              r={used ? 6 : 4.5}
              fill={used ? "var(--brass)" : "var(--concrete-100)"}
              stroke="var(--ink)"
              strokeWidth="1.6"
            />
          );
        })}
      </g>
    );
  });
}

function Cross({
  at,
  colour,
  width = 2.2,
  reach = 7,
  ring = false,
}: {
  at: Spot;
  colour: string;
  width?: number;
  reach?: number;
  ring?: boolean;
}) {
  return (
    <g stroke={colour} fill="none">
      {ring ? (
        <circle
          cx={at.x}
          cy={at.y}
          r="13"
          fill="var(--brass-wash)"
          fillOpacity=".7"
          stroke="var(--brass-ink)"
          strokeWidth="2.5"
        />
      ) : null}
      <path
        d={`M${at.x - reach} ${at.y}h${2 * reach}M${at.x} ${at.y - reach}v${2 * reach}`}
        strokeWidth={width}
      />
    </g>
  );
}

function Drops({ view, to, size, scale, inHand }: PlanProps & { to: To }) {
  const placed = view.drops.flatMap((drop) =>
    drop.reading ? [{ drop, reading: drop.reading, spot: to(drop.reading.at) }] : [],
  );
  const crosses: Box[] = placed.map(({ spot }) => ({ x: spot.x - 8, y: spot.y - 8, width: 16, height: 16 }));
  const labels = placeLabels(
    placed.map(({ drop, reading, spot }): Label => {
      const side = drop.side === "left" ? -1 : 1;
      const ahead = drop.point.endsWith("rear") ? -1 : drop.point.endsWith("front") ? 1 : 0.2;
      return {
        key: `${drop.point}:${drop.side}`,
        text: dropLabel(reading),
        spot,
        size: 15,
        lean: { x: ahead, y: side * 0.6 },
        weight: 600,
      };
    }),
    crosses,
    { x: 0, y: 0, width: size.width, height: size.height },
  );
  return (
    <g>
      {placed.map(({ drop, reading, spot }) => {
        const held = inHand?.point === drop.point && inHand.side === drop.side;
        const ellipse = ellipseFor(view, reading);
        const drawn = ELLIPSE_DRAWN * scale.k;
        const colour = reading.suspect
          ? "var(--oxide)"
          : reading.stands
            ? "var(--ink)"
            : "var(--concrete-500)";
        return (
          <g key={`${drop.point}:${drop.side}`}>
            <ellipse
              cx={spot.x}
              cy={spot.y}
              rx={ellipse.major * drawn}
              ry={Math.max(1, ellipse.minor * drawn)}
              transform={`rotate(${-ellipse.angle} ${spot.x} ${spot.y})`}
              fill="var(--line)"
              fillOpacity=".13"
              stroke="var(--line)"
              strokeWidth=".9"
            />
            <Cross at={spot} colour={colour} ring={held} />
            {reading.stands ? null : (
              <circle cx={spot.x} cy={spot.y} r="10" fill="none" stroke={colour} strokeDasharray="2 3" />
            )}
          </g>
        );
      })}
      {labels.map((label) => (
        <text
          key={label.key}
          x={label.at.x}
          y={label.at.y}
          textAnchor={label.anchor}
          fontSize={label.size}
          fontWeight="600"
          {...HALO}
        >
          {label.text}
        </text>
      ))}
    </g>
  );
}
