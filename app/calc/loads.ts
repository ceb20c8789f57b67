import { z } from "zod";
import { axleLoadsAfterMove } from "../domain/loads/axle-move";
import { cgHeightByLifting } from "../domain/loads/cg-height";
import { weightPlace } from "../domain/loads/corner-weights";
import { loadTransfer } from "../domain/loads/load-transfer";
import { springLoad } from "../domain/loads/spring-load";
import { type Outcome, ok } from "../domain/outcome";
import { mm } from "../domain/units/length";
import { defineCalc } from "./calc";
import { LOADS_EXAMPLES } from "./loads-examples";

/** Longer than any vehicle, mm, and heavier than any on a road, N. */
const LONGEST = 30_000;
const HEAVIEST = 1_000_000;

const size = (words: string) => z.number().positive().max(LONGEST).describe(words);
const newtons = (words: string) => z.number().min(0).max(HEAVIEST).describe(`${words}, newtons.`);
const moved = (words: string) => z.number().min(-LONGEST).max(LONGEST).default(0).describe(words);
const out = (words: string) => z.number().describe(words);

const cornersInput = z.strictObject({
  what: z.literal("corners").describe("Centre of gravity seen from above, from the four wheels on scales."),
  leftFrontNewtons: newtons("Left front wheel"),
  rightFrontNewtons: newtons("Right front wheel"),
  leftRearNewtons: newtons("Left rear wheel"),
  rightRearNewtons: newtons("Right rear wheel"),
  wheelbase: size("Front to rear axle."),
  frontTrack: size("Middle to middle of the front tyres."),
  rearTrack: size("Middle to middle of the rear tyres."),
});

const heightInput = z.strictObject({
  what: z.literal("cgHeight").describe("Height of the centre of gravity, from lifting one axle."),
  weightNewtons: newtons("The whole vehicle"),
  wheelbase: size("Front to rear axle."),
  levelLoadNewtons: newtons("Axle left down, vehicle level"),
  liftedLoadNewtons: newtons("Axle left down, the other lifted"),
  lift: size("How far the centre of the lifted axle was raised."),
  downRadius: size("Loaded tyre radius of the axle left down."),
  liftedRadius: size("Loaded tyre radius of the lifted axle as it stood on the floor."),
});

const transferInput = z.strictObject({
  what: z.literal("transfer").describe("Axle loads under power or braking."),
  frontNewtons: newtons("Front axle standing"),
  rearNewtons: newtons("Rear axle standing"),
  cgHeight: size("Centre of gravity above the ground."),
  wheelbase: size("Front to rear axle."),
  accelerationG: z.number().min(-5).max(5).describe("Acceleration in g; braking negative."),
});

const moveInput = z.strictObject({
  what: z.literal("move").describe("Axle loads after the axles are moved on the frame."),
  frontNewtons: newtons("Front axle before"),
  rearNewtons: newtons("Rear axle before"),
  wheelbase: size("Front to rear axle before."),
  frontForward: moved("How far the front axle is moved forward; back negative."),
  rearForward: moved("How far the rear axle is moved forward; back negative."),
  frontUnsprungNewtons: newtons("What is moved with the front axle").default(0),
  rearUnsprungNewtons: newtons("What is moved with the rear axle").default(0),
});

const springInput = z.strictObject({
  what: z.literal("spring").describe("What one spring carries at ride height."),
  cornerNewtons: newtons("Scale under the wheel"),
  unsprungNewtons: newtons("Wheel, tyre, brake, half the axle and of the spring"),
  motionRatio: z
    .number()
    .positive()
    .max(5)
    .default(1)
    .describe("Spring travel by wheel travel; 1 for a leaf-sprung solid axle."),
});

const cornersOut = z.object({
  what: z.literal("corners").describe("As asked."),
  weightNewtons: out("All four wheels, newtons."),
  frontNewtons: out("Front axle, newtons."),
  rearNewtons: out("Rear axle, newtons."),
  frontShare: out("Share on the front axle, 0 to 1."),
  leftShare: out("Share on the left side, 0 to 1."),
  crossShare: out("Share on left front and right rear together, 0 to 1."),
  behindFront: out("Centre of gravity behind the front axle."),
  leftOfCentre: out("Centre of gravity left of the centre line; right negative."),
});
const heightOut = z.object({
  what: z.literal("cgHeight").describe("As asked."),
  height: out("Centre of gravity above the floor."),
  aboveAxles: out("The same above the line through the axle centres."),
  tilt: out("How far the vehicle was tilted, degrees."),
  heightPerNewton: out("What one newton read wrong does to the height, mm."),
});
const transferOut = z.object({
  what: z.literal("transfer").describe("As asked."),
  frontNewtons: out("Front axle, newtons."),
  rearNewtons: out("Rear axle, newtons."),
  toRearNewtons: out("Gone from the front axle to the rear, newtons; negative under braking."),
  liftsAtG: z
    .number()
    .nullable()
    .describe("Acceleration in g at which the lightened axle leaves the ground; null at no acceleration."),
});
const moveOut = z.object({
  what: z.literal("move").describe("As asked."),
  frontNewtons: out("Front axle after, newtons."),
  rearNewtons: out("Rear axle after, newtons."),
  wheelbase: out("Front to rear axle after."),
});
const springOut = z.object({
  what: z.literal("spring").describe("As asked."),
  springNewtons: out("What the spring carries, newtons."),
  sprungNewtons: out("Sprung weight on the wheel, newtons."),
});

const input = z.discriminatedUnion("what", [
  cornersInput,
  heightInput,
  transferInput,
  moveInput,
  springInput,
]);
const output = z.discriminatedUnion("what", [cornersOut, heightOut, transferOut, moveOut, springOut]);

type Answer<T extends z.ZodType> = Outcome<z.input<T>>;

function runCorners(given: z.output<typeof cornersInput>): Answer<typeof cornersOut> {
  const place = weightPlace(
    {
      leftFront: given.leftFrontNewtons,
      rightFront: given.rightFrontNewtons,
      leftRear: given.leftRearNewtons,
      rightRear: given.rightRearNewtons,
    },
    { wheelbase: mm(given.wheelbase), frontTrack: mm(given.frontTrack), rearTrack: mm(given.rearTrack) },
  );
  if (!place.ok) return place;
  const { weight, frontAxle, rearAxle, ...rest } = place.value;
  return ok({
    what: "corners",
    weightNewtons: weight,
    frontNewtons: frontAxle,
    rearNewtons: rearAxle,
    ...rest,
  });
}

function runHeight(given: z.output<typeof heightInput>): Answer<typeof heightOut> {
  const found = cgHeightByLifting({
    weight: given.weightNewtons,
    wheelbase: mm(given.wheelbase),
    levelLoad: given.levelLoadNewtons,
    liftedLoad: given.liftedLoadNewtons,
    lift: mm(given.lift),
    downRadius: mm(given.downRadius),
    liftedRadius: mm(given.liftedRadius),
  });
  return found.ok ? ok({ what: "cgHeight", ...found.value }) : found;
}

function runTransfer(given: z.output<typeof transferInput>): Answer<typeof transferOut> {
  const { frontNewtons: front, rearNewtons: rear, accelerationG } = given;
  const found = loadTransfer({ front, rear }, mm(given.cgHeight), mm(given.wheelbase), accelerationG);
  if (!found.ok) return found;
  return ok({
    what: "transfer",
    frontNewtons: found.value.front,
    rearNewtons: found.value.rear,
    toRearNewtons: found.value.toRear,
    liftsAtG: found.value.liftsAt,
  });
}

function runMove(given: z.output<typeof moveInput>): Answer<typeof moveOut> {
  const found = axleLoadsAfterMove({
    loads: { front: given.frontNewtons, rear: given.rearNewtons },
    wheelbase: mm(given.wheelbase),
    frontForward: mm(given.frontForward),
    rearForward: mm(given.rearForward),
    frontUnsprung: given.frontUnsprungNewtons,
    rearUnsprung: given.rearUnsprungNewtons,
  });
  if (!found.ok) return found;
  const { front, rear, wheelbase } = found.value;
  return ok({ what: "move", frontNewtons: front, rearNewtons: rear, wheelbase });
}

function runSpring(given: z.output<typeof springInput>): Answer<typeof springOut> {
  const found = springLoad(given.cornerNewtons, given.unsprungNewtons, given.motionRatio);
  return found.ok
    ? ok({ what: "spring", springNewtons: found.value.load, sprungNewtons: found.value.sprung })
    : found;
}

function run(given: z.output<typeof input>): Answer<typeof output> {
  switch (given.what) {
    case "corners":
      return runCorners(given);
    case "cgHeight":
      return runHeight(given);
    case "transfer":
      return runTransfer(given);
    case "move":
      return runMove(given);
    case "spring":
      return runSpring(given);
  }
}

export const loadsCalc = defineCalc({
  name: "loads",
  title: "Weights and axle loads",
  summary:
    "Centre of gravity from corner weights and from lifting an axle; axle loads under power and braking and after an axle is moved; what a spring carries. Statics: moments about the axles.",
  input: input.meta({ type: "object" }),
  output,
  run,
  examples: LOADS_EXAMPLES,
  cautions: [
    "Lifting an axle to weigh: firm level floor, wheels on the floor chocked, the lifted axle on rated stands, nobody under the vehicle.",
    "Axle and tyre ratings are the makers': no axle load worked out here is leave to exceed one.",
  ],
});
