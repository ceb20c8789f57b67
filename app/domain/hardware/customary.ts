import { MM_PER_INCH } from "../units/length";

/** One pound of force in newtons: 0.45359237 kg × 9.80665 m/s², both exact by definition. */
export const NEWTONS_PER_POUND = 0.45359237 * 9.80665;

/** One ksi (1000 pounds per square inch) in megapascals. */
export const MPA_PER_KSI = (1000 * NEWTONS_PER_POUND) / (MM_PER_INCH * MM_PER_INCH);

/** One foot-pound in newton metres. */
export const NEWTON_METRES_PER_FOOT_POUND = (12 * MM_PER_INCH * NEWTONS_PER_POUND) / 1000;

/** One thousand pounds of force per inch of length in newtons per millimetre. */
export const NEWTONS_PER_MM_PER_KIP_INCH = (1000 * NEWTONS_PER_POUND) / MM_PER_INCH;
