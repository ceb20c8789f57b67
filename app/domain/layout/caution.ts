import type { StepId } from "./steps";

/** What can hurt somebody at a step, in a sentence each. Local codes, the parts maker and licensed practice come first. */
const CAUTIONS: Record<StepId, readonly string[]> = {
  stands: [
    "Rated stands on a firm floor, never a jack alone.",
    "Chock every wheel that still touches the floor, and try the vehicle by hand before anyone goes under.",
    "Leaf springs and bump stops store energy: take the load off before a bolt is loosened.",
  ],
  level: [
    "Raise with the jack, rest on the stand: read only with the jack down and hands clear.",
    "One stand at a time, others watched.",
  ],
  marks: [],
  drops: ["Nobody goes under while a stand is being touched."],
  "axle-line": ["Figures here are an aid to layout, not an engineering certificate."],
  options: [
    "Moving an axle changes steering, brakes and propshaft: these are safety-critical and want the inspection that local law asks for.",
    "Figures here are an aid to layout, not an engineering certificate.",
  ],
  "second-look": ["Somebody else measures, without seeing the first figures."],
  approval: [
    "Changes to vehicles are regulated where you live: check before you cut.",
    "The parts maker's instructions and licensed practice come before these figures.",
  ],
  tack: [
    "Battery and electronics disconnected, fuel and brake lines covered, eyes protected, air moving, somebody on fire watch.",
  ],
  weld: [
    "Frame and suspension welds are for a qualified welder, to the code that applies.",
    "Torque with the bushings at ride height: clamped at droop they twist, and tear, as soon as it stands on its wheels.",
  ],
  finish: ["Brake hoses and wiring at full droop, steering lock to lock, then the road test."],
};

/** What is signed before the first bead. */
export const BEFORE_WELDING: readonly string[] = [
  "Battery and electronics disconnected, the earth clamp close to the weld.",
  "Fuel, brake and other lines covered or taken off, nothing that burns in reach of sparks.",
  "Eyes, skin and lungs protected, air moving, those nearby warned.",
  "Somebody on fire watch, also after the last bead.",
  "Springs without load, vehicle on rated stands, wheels chocked.",
  "Frame and suspension welds are for a qualified welder, to the code that applies here.",
];

/** The cautions of a step; empty where nothing special can hurt. */
export const cautionFor = (step: StepId): readonly string[] => CAUTIONS[step];
