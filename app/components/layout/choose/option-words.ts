import { notDistinguishable, type Option } from "../../../domain/layout/options";
import { describeSpring, halves } from "../../../domain/springs/leaf-spring";
import { formatDegrees } from "../../../domain/units/angle";
import {
  formatDecimalInches,
  formatInches,
  type LengthUnit,
  type Millimetres,
  mm,
} from "../../../domain/units/length";

/** A signed station difference in decimal inches: "+2.09". */
export const signed = (length: Millimetres): string => {
  const words = formatDecimalInches(length);
  return length > 0 && !/^0\.0*$/.test(words) ? `+${words}` : words;
};

export const roomWords = (room: Option["frontRoom"]): string =>
  room ? `${formatDecimalInches(room.straight)} · ${formatDecimalInches(room.atLock)}` : "–";

export const springHead = (option: Option): { title: string; detail: string } => {
  const { front, rear } = halves(option.spring, option.turned);
  return {
    title: option.turned
      ? `${describeSpring(option.spring, true)}: turned end for end`
      : describeSpring(option.spring),
    detail: `halves ${formatInches(front)} + ${formatInches(rear)} · rack ${option.spring.rackNumber}`,
  };
};

/** "pin 2 in ahead, hole 1" */
export const shortName = (option: Option): string => {
  const spring = describeSpring(option.spring, option.turned).replace(/^[^,]*, /, "");
  return `${formatInches(option.spring.length)} in ${spring}${option.turned ? " (turned)" : ""}, hole ${option.hole.number}`;
};

/** Room by the whole tyre's reach in plan: at the lip, which is higher, there is more. */
const roomSentence = (atLock: Millimetres): string =>
  atLock >= 0
    ? `${formatDecimalInches(atLock)} in left in front at lock`
    : `${formatDecimalInches(mm(-atLock))} in short in front at lock by the whole tyre: measure the lip`;

/** What the option in hand changes, in one line. */
export function inHandDetail(option: Option): string {
  const parts = [
    `${formatDecimalInches(mm(Math.abs(option.shift)))} ${option.shift >= 0 ? "ahead of" : "behind"} the centre`,
    option.approach === null ? null : `approach ${formatDegrees(option.approach)}`,
    option.wheelbase === null ? null : `wheelbase ${formatDecimalInches(option.wheelbase)}`,
    option.frontRoom === null ? null : roomSentence(option.frontRoom.atLock),
  ];
  return `${parts.filter((part) => part !== null).join("; ")}.`;
}

/** How two options differ, in sentences. */
export function compareWords(a: Option, b: Option, _unit: LengthUnit): { same: boolean; words: string }[] {
  const same = notDistinguishable(a, b);
  const list = [
    {
      same,
      words: same
        ? `Not distinguishable in axle line: ${formatDecimalInches(a.axleStation)} and ${formatDecimalInches(b.axleStation)}, each ± ${formatDecimalInches(a.plusMinus)}.`
        : `${formatDecimalInches(mm(Math.abs(a.axleStation - b.axleStation)))} in apart: ${shortName(a)} puts the axle ${a.axleStation > b.axleStation ? "further ahead" : "further back"}.`,
    },
  ];
  if (a.approach !== null && b.approach !== null && !same)
    list.push({
      same: false,
      words: `Approach ${formatDegrees(a.approach)} against ${formatDegrees(b.approach)}.`,
    });
  if (a.spring.id !== b.spring.id)
    list.push({
      same: false,
      words: `Two springs of the rack: ${a.spring.rackNumber} and ${b.spring.rackNumber}.`,
    });
  return list;
}
