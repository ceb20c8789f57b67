import { z } from "zod";
import { type Outcome, ok } from "../domain/outcome";
import { davisAngle, innerAngle, outerAngle } from "../domain/steering/ackermann";
import { bumpSteer, steerPerInch } from "../domain/steering/bump-steer";
import { dragLink, dragLinkChange, vehiclePoint } from "../domain/steering/drag-link";
import { fourBar } from "../domain/steering/four-bar";
import { degrees } from "../domain/units/angle";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { STEERING_EXAMPLES } from "./steering-examples";

const coordinate = (words: string) => z.number().min(-20_000).max(20_000).describe(words);
const size = (words: string) => z.number().positive().max(20_000).describe(words);
const pointFields = (words: string) =>
  z
    .strictObject({
      x: coordinate("Ahead."),
      y: coordinate("To the left."),
      z: coordinate("Up."),
    })
    .describe(words);
type PointIn = z.output<ReturnType<typeof pointFields>>;
const point = ({ x, y, z: up }: PointIn) => vehiclePoint(x, y, up);

const dragLinkIn = z.strictObject({
  what: z.literal("drag-link").describe("A link, and how it changes when the axle moves."),
  box: pointFields("Ball at the steering box's arm."),
  axle: pointFields("Ball at the axle."),
  moved: coordinate("How far the axle moves, ahead positive.").default(0),
});
const bumpIn = z.strictObject({
  what: z.literal("bump-steer").describe("How far the knuckle turns through the travel."),
  box: pointFields("Ball at the steering box's arm, held still."),
  arm: pointFields("Ball on the steering arm, at ride height."),
  kingpin: pointFields("A point of the upright axis that the knuckle turns about."),
  path: z
    .array(
      z.strictObject({
        rise: z.number().min(-1000).max(1000).describe("Of the axle from ride height, up positive."),
        ahead: z.number().min(-1000).max(1000).describe("How far ahead the axle goes there."),
      }),
    )
    .min(1)
    .max(200)
    .describe("The axle's path."),
});
const ackermannIn = z.strictObject({
  what: z.literal("ackermann").describe("Wheels that roll about one point."),
  pivots: size("Distance of the kingpins."),
  wheelbase: size("Wheelbase."),
  inner: z.number().min(0).lt(90).optional().describe("Inner wheel, degrees: the outer one is answered."),
  outer: z.number().min(0).lt(60).optional().describe("Outer wheel, degrees: the inner one is answered."),
});
const fourBarIn = z.strictObject({
  what: z.literal("four-bar").describe("Position of a four-bar linkage."),
  ground: size("Ground link."),
  crank: size("Crank."),
  coupler: size("Coupler."),
  rocker: size("Rocker."),
  angle: z.number().min(-360).max(360).describe("Crank from the ground link, degrees."),
});

const position = (words: string) =>
  z
    .object({ coupler: z.number().describe("Degrees."), rocker: z.number().describe("Degrees.") })
    .describe(words);
const output = z.discriminatedUnion("what", [
  z.object({
    what: z.literal("drag-link").describe("As asked."),
    length: z.number().describe("Ball to ball."),
    planAngle: z.number().describe("In plan, degrees, far end to the left positive."),
    sideAngle: z.number().describe("From the side, degrees, far end higher positive."),
    change: z.number().describe("How much longer it has to be when the axle has moved."),
  }),
  z.object({
    what: z.literal("bump-steer").describe("As asked."),
    places: z
      .array(
        z.object({
          rise: z.number().describe("As sent."),
          ahead: z.number().describe("As sent."),
          turn: z.number().describe("Of the knuckle, degrees, to the left positive."),
        }),
      )
      .describe("By rise."),
    perInch: z.number().nullable().describe("Degrees for an inch about ride height. Null: one place only."),
  }),
  z.object({
    what: z.literal("ackermann").describe("As asked."),
    inner: z.number().nullable().describe("Inner wheel, degrees."),
    outer: z.number().nullable().describe("Outer wheel, degrees."),
    davis: z.number().describe("Angle of a gear of sliding arms that steers so throughout, degrees."),
  }),
  z.object({
    what: z.literal("four-bar").describe("As asked."),
    open: position("Put together open."),
    crossed: position("Put together crossed."),
  }),
]);
type Out = z.input<typeof output>;
const input = z.discriminatedUnion("what", [dragLinkIn, bumpIn, ackermannIn, fourBarIn]);

function run(asked: z.output<typeof input>): Outcome<Out> {
  switch (asked.what) {
    case "drag-link": {
      const [box, axle] = [point(asked.box), point(asked.axle)];
      const link = dragLink(box, axle);
      if (!link.ok) return link;
      const change = dragLinkChange(box, axle, mm(asked.moved));
      return change.ok ? ok({ what: "drag-link", ...link.value, change: change.value }) : change;
    }
    case "bump-steer": {
      const { box, arm, kingpin, path } = asked;
      const steered = bumpSteer({
        box: point(box),
        arm: point(arm),
        kingpin: point(kingpin),
        path: path.map(({ rise, ahead }) => ({ rise: mm(rise), ahead: mm(ahead) })),
      });
      if (!steered.ok) return steered;
      return ok({
        what: "bump-steer",
        places: steered.value.map((place) => ({ ...place })),
        perInch: steerPerInch(steered.value),
      });
    }
    case "ackermann": {
      const [pivots, wheelbase] = [mm(asked.pivots), mm(asked.wheelbase)];
      const { inner, outer } = asked;
      return ok({
        what: "ackermann",
        inner: inner ?? (outer === undefined ? null : innerAngle(degrees(outer), pivots, wheelbase)),
        outer: inner === undefined ? (outer ?? null) : outerAngle(degrees(inner), pivots, wheelbase),
        davis: davisAngle(pivots, wheelbase),
      });
    }
    case "four-bar": {
      const came = fourBar(asked, degrees(asked.angle));
      return came.ok
        ? ok({ what: "four-bar", open: { ...came.value.open }, crossed: { ...came.value.crossed } })
        : came;
    }
  }
}

export const steeringCalc = defineCalc({
  name: "steering",
  title: "Steering",
  summary:
    "Drag link in space and its change with the axle, bump steer along the axle's path, wheels that roll about one point, and a four-bar linkage: solid geometry.",
  input,
  output,
  run,
  examples: STEERING_EXAMPLES,
  cautions: [
    "Steering is safety-critical: changes to it want the inspection that local law demands, by licensed people.",
    "An aid to layout, not an engineering certificate.",
  ],
});
