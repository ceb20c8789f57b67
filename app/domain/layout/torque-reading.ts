/** What somebody typed as a torque: one figure or a span, and the unit in letters only. */
type Torque = { least: number; most: number; span: boolean; unit: string };

const FIGURE = String.raw`(\d+(?:[.,]\d+)?)`;
const TORQUE = new RegExp(`^${FIGURE}(?:\\s*(?:-|–|to)\\s*${FIGURE})?\\s*([a-z][a-z\\s·.*/-]*)?$`, "i");

function read(typed: string): Torque | null {
  const [, first, second, unit = ""] = TORQUE.exec(typed.trim()) ?? [];
  if (first === undefined) return null;
  const figure = (text: string) => Number(text.replace(",", "."));
  const [a, b] = [figure(first), figure(second ?? first)];
  return {
    least: Math.min(a, b),
    most: Math.max(a, b),
    span: second !== undefined,
    // "ft lb", "lb-ft" and "lbf·ft" are one unit: its letters in any order.
    unit: [
      ...unit
        .toLowerCase()
        .replace(/[^a-z]/g, "")
        .replace(/lbf(?!t)/, "lb"),
    ]
      .sort()
      .join(""),
  };
}

/**
 * Does a torque that was read meet the one that was specified? A single figure has to be reached, a span to be met.
 * `unknown` where either cannot be read as a figure (torque and angle, other units): then the person's word counts.
 * @example meetsTorque("110 ft lb", "90") // "low"
 */
export function meetsTorque(specified: string, reading: string): "meets" | "low" | "high" | "unknown" {
  const [wanted, got] = [read(specified), read(reading)];
  if (!wanted || !got || got.span) return "unknown";
  if (wanted.unit && got.unit && wanted.unit !== got.unit) return "unknown";
  if (got.least < wanted.least) return "low";
  return wanted.span && got.most > wanted.most ? "high" : "meets";
}
