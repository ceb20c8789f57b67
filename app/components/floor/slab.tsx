import type { BayCard, Board } from "../../domain/floor/board";
import { aisleOf, type Box, bayBox, markPoint, type PlanExtent, paintPath } from "./geometry";

const JOINT_FT = 13;
/** Grains of the slab within one field between joints: strewn, yet the same on the server and in the browser. */
const GRAIN = Array.from({ length: 14 }, (_, i) => [
  Math.round(((i * 7.31 + 1.7) % JOINT_FT) * 100) / 100,
  Math.round(((i * 4.93 + (i % 3) * 2.2) % JOINT_FT) * 100) / 100,
  0.03 + (i % 4) * 0.008,
]);

const steps = (to: number) =>
  Array.from({ length: Math.max(0, Math.ceil(to / JOINT_FT) - 1) }, (_, i) => (i + 1) * JOINT_FT);

/** The floor under everything: slab, joints, pads, lifts, curtains, paint and walls. Drawn in feet. */
export function Slab({ board, extent }: { board: Board; extent: PlanExtent }) {
  const { building } = extent;
  return (
    <svg
      className="slab-ground"
      viewBox={`0 0 ${extent.w} ${extent.h}`}
      preserveAspectRatio="none"
      aria-hidden="true"
    >
      <defs>
        <pattern id="slab-grain" width={JOINT_FT} height={JOINT_FT} patternUnits="userSpaceOnUse">
          {GRAIN.map(([x, y, r]) => (
            <circle key={x} cx={x} cy={y} r={r} className="fill-concrete-300" opacity=".8" />
          ))}
        </pattern>
      </defs>
      <rect width={building.w} height={building.h} className="fill-concrete-200" />
      <rect width={building.w} height={building.h} fill="url(#slab-grain)" />
      <g stroke="#cfcbc2" strokeWidth="1">
        {steps(building.w).map((x) => (
          <path key={x} d={`M${x} 0V${building.h}`} />
        ))}
        {steps(building.h).map((y) => (
          <path key={y} d={`M0 ${y}H${building.w}`} />
        ))}
      </g>
      {board.bays.map((card) => (
        <BayGround key={card.bay.id} card={card} />
      ))}
      <Walls board={board} building={building} />
    </svg>
  );
}

function BayGround({ card }: { card: BayCard }) {
  const { bay } = card;
  const box = bayBox(bay);
  const paint = paintPath(box, bay.mouth);
  return (
    <g>
      {bay.kind === "level-pad" ? <Pad box={box} /> : null}
      {bay.kind === "lift" ? <Lift box={box} /> : null}
      {bay.kind === "weld" ? <Curtains box={box} /> : null}
      <path d={paint} fill="none" className="stroke-paint-edge" strokeWidth="8" />
      <path d={paint} fill="none" stroke="#fdfcfa" strokeWidth="5.8" />
      <SnappedLine card={card} />
    </g>
  );
}

/** A ground pad lies a little proud of the slab: a lighter field with its own edge. */
function Pad({ box }: { box: Box }) {
  return (
    <rect
      x={box.x + 0.7}
      y={box.y + 0.7}
      width={box.w - 1.4}
      height={box.h - 1.4}
      fill="#e9e7e1"
      stroke="#c3bfb5"
      strokeWidth="1"
    />
  );
}

function Lift({ box }: { box: Box }) {
  const middle = box.y + box.h / 2 - 0.4;
  const x = box.x + box.w * 0.05;
  const w = box.w * 0.72;
  return (
    <g>
      {[-2.95, 1.35].map((dy) => (
        <rect
          key={dy}
          x={x}
          y={middle + dy}
          width={w}
          height="1.6"
          fill="#cdc9bf"
          stroke="#96928a"
          strokeWidth="1"
        />
      ))}
      {[0, w - 0.7].flatMap((dx) =>
        [-2.9, 1.4].map((dy) => (
          <rect
            key={`${dx} ${dy}`}
            x={x + dx}
            y={middle + dy}
            width=".7"
            height="1.5"
            className="fill-concrete-500"
          />
        )),
      )}
    </g>
  );
}

/** Weld curtains hang in folds along both sides. */
function Curtains({ box }: { box: Box }) {
  const folds = Math.floor((box.w - 2.4) / 0.92);
  const fold = "q.23 -.3 .46 0t.46 0".repeat(Math.max(0, folds));
  return (
    <g fill="none" stroke="#a9a59a" strokeWidth="1.4">
      <path d={`M${box.x + 0.8} ${box.y + 0.62}${fold}`} />
      <path d={`M${box.x + 0.8} ${box.y + box.h - 0.55}${fold}`} />
    </g>
  );
}

/** The bay's snapped line through A and B, with the marks where the survey has them. */
function SnappedLine({ card }: { card: BayCard }) {
  const { bay } = card;
  const on = bay.marks.filter((mark) => Math.abs(mark.yMm) < 1);
  const [first, last] = [on[0], on.at(-1)];
  if (!first || !last || first === last) return null;
  const box = bayBox(bay);
  const at = markPoint(bay, first);
  const long = bay.mouth === "east" || bay.mouth === "west";
  const line = long
    ? `M${box.x + 1.2} ${at.y}H${box.x + box.w - 1.2}`
    : `M${at.x} ${box.y + 1.2}V${box.y + box.h - 1.2}`;
  return <path d={line} fill="none" className="stroke-line" strokeWidth="1.3" />;
}

/** Walls, with a roll-up door where the aisle meets the yard. */
function Walls({ board, building }: { board: Board; building: { w: number; h: number } }) {
  const aisle = aisleOf(board);
  const { w, h } = building;
  const out = 0.35;
  const [from, to] = aisle ? [aisle.x + 1, aisle.x + aisle.w - 1] : [w / 2 - 6, w / 2 + 6];
  const slats = Array.from({ length: Math.floor((to - from) / 0.7) }, (_, i) => from + (i + 1) * 0.7);
  return (
    <g>
      <path
        d={`M${from} ${h + out}H${-out}V${-out}H${w + out}V${h + out}H${to}`}
        fill="none"
        className="stroke-concrete-700"
        strokeWidth="9"
      />
      <rect
        x={from}
        y={h + 0.05}
        width={to - from}
        height=".6"
        className="fill-chalk stroke-concrete-700"
        strokeWidth="1"
      />
      <path
        d={slats.map((x) => `M${x} ${h + 0.05}v.6`).join("")}
        className="stroke-concrete-300"
        strokeWidth="1"
      />
    </g>
  );
}
