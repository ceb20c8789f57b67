import { z } from "zod";
import type { LengthUnit } from "../domain/units/length";
import { type LengthRange, lengthEntry } from "./length-entry";

const SPRING_LENGTH: LengthRange = { least: 300, most: 2500, what: "A leaf spring is" };
const HALF_LENGTH: LengthRange = { least: 50, most: 2450, what: "A front half is" };
const LEAF_WIDTH: LengthRange = { least: 25, most: 150, what: "A leaf is" };

const wholeNumber = (least: number, most: number, words: string) =>
  z
    .string({ error: words })
    .trim()
    .refine((typed) => /^\d+$/.test(typed) && Number(typed) >= least && Number(typed) <= most, words)
    .transform(Number);

/**
 * A spring as it is put into the rack, measured flat on the bench.
 * @param unit what a bare number on a length field means in this shop
 */
export const springForm = (unit: LengthUnit) =>
  z
    .object({
      rackNumber: wholeNumber(1, 9999, "The number painted on the rack, from 1 to 9999."),
      length: lengthEntry(unit, SPRING_LENGTH),
      frontHalf: lengthEntry(unit, HALF_LENGTH),
      leaves: wholeNumber(1, 30, "How many leaves, from 1 to 30."),
      leafWidth: lengthEntry(unit, LEAF_WIDTH),
      note: z.string().trim().max(120, "At most 120 signs.").default(""),
    })
    .refine(
      (spring) => !spring.length?.mm || !spring.frontHalf?.mm || spring.frontHalf.mm < spring.length.mm,
      {
        // Said beside other faults too, so that every one is named at once.
        when: () => true,
        path: ["frontHalf"],
        message: "The front half must be shorter than the spring: measure from the front eye to the pin.",
      },
    );

export type SpringEntry = z.output<ReturnType<typeof springForm>>;
