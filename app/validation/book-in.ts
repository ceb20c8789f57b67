import { z } from "zod";
import { BUILD_TEMPLATE_IDS, BUILD_TEMPLATES } from "../domain/builds/stages";
import { VEHICLE_KINDS } from "../domain/builds/vehicle-kinds";
import type { LengthUnit } from "../domain/units/length";
import { type LengthRange, lengthEntry, optionalLength } from "./length-entry";

export const NICKNAME_LONGEST = 24;

const VEHICLE_LENGTH: LengthRange = { least: 600, most: 30_000, what: "A vehicle is" };
const VEHICLE_WIDTH: LengthRange = { least: 400, most: 5000, what: "A vehicle is" };
const RADIUS: LengthRange = { least: 150, most: 1000, what: "A tyre's radius is" };
const TYRE_WIDTH: LengthRange = { least: 80, most: 700, what: "A tyre's width is" };
const WHEELBASE: LengthRange = { least: 800, most: 12_000, what: "A wheelbase is" };

const text = (longest: number, words: string) =>
  z.string({ error: words }).trim().max(longest, `At most ${longest} signs.`);
const optionalText = (longest: number) =>
  z.string().trim().max(longest, `At most ${longest} signs.`).default("");

/** Whole degrees; nothing typed means that nothing was asked for. */
const approach = z
  .string()
  .trim()
  .default("")
  .transform((typed, ctx) => {
    if (typed === "") return null;
    const degrees = Number(typed.replace(/\s*(°|deg(rees)?)$/i, ""));
    if (!Number.isInteger(degrees) || degrees < 1 || degrees > 89)
      ctx.addIssue({ code: "custom", message: "Whole degrees, from 1 to 89." });
    return degrees;
  });

const hours = z
  .string()
  .trim()
  .transform((typed, ctx) => {
    const value = Number(typed.replace(",", "."));
    if (typed === "" || !Number.isFinite(value) || value <= 0 || value > 200) {
      ctx.addIssue({ code: "custom", message: "Hours, more than 0 and at most 200." });
      return 0;
    }
    return Math.round(value * 100) / 100;
  })
  .optional();

const MOST_STAGES = Math.max(...BUILD_TEMPLATE_IDS.map((id) => BUILD_TEMPLATES[id].stages.length));
const PLACES = Array.from({ length: MOST_STAGES }, (_, index) => index);

const tick = z.string().optional();
type StageShape = Record<`stage-${number}`, typeof tick> & Record<`hours-${number}`, typeof hours>;
/** `stage-0`: ticked or not; `hours-0`: its hours; and so on for every stage of the chosen list. */
const stageShape = Object.fromEntries(
  PLACES.flatMap((index) => [
    [`stage-${index}`, tick],
    [`hours-${index}`, hours],
  ]),
) as StageShape;

/** A stage's own fields: the schema's types do not carry the numbered names. */
type StageFields = Record<`stage-${number}`, string | undefined> &
  Record<`hours-${number}`, number | undefined>;
const isTicked = (form: object, index: number) => (form as StageFields)[`stage-${index}`] !== undefined;
const hoursOf = (form: object, index: number) => (form as StageFields)[`hours-${index}`];

const isDate = (typed: string) =>
  /^\d{4}-\d{2}-\d{2}$/.test(typed) && !Number.isNaN(Date.parse(`${typed}T00:00:00Z`));
const isTime = (typed: string) => /^([01]\d|2[0-3]):[0-5]\d(:[0-5]\d)?$/.test(typed);

/** A refinement that speaks even when other fields are wrong, so that every fault is named at once. */
const always = { when: () => true };

/**
 * The book-in form, as the browser and the server both read it.
 * @param unit what a bare number on a length field means in this shop
 */
export const bookInForm = (unit: LengthUnit) =>
  z
    .object({
      customerId: z.string().trim().default(""),
      customerName: optionalText(80),
      customerPhone: optionalText(40),
      customerEmail: z
        .string()
        .trim()
        .max(190, "At most 190 signs.")
        .default("")
        .refine(
          (typed) => typed === "" || z.email().safeParse(typed).success,
          "That is not an e-mail address.",
        ),
      kind: z.enum(VEHICLE_KINDS, { error: "Choose what kind of vehicle it is." }),
      nickname: text(NICKNAME_LONGEST, "Give it a nickname: it goes on the tape.").min(
        1,
        "Give it a nickname: it goes on the tape.",
      ),
      length: lengthEntry(unit, VEHICLE_LENGTH),
      width: lengthEntry(unit, VEHICLE_WIDTH),
      wanted: text(2000, "Write down what the customer wants.").min(1, "Write down what the customer wants."),
      tyre: optionalText(40),
      loadedRadius: optionalLength(unit, RADIUS),
      tyreRadius: optionalLength(unit, RADIUS),
      tyreWidth: optionalLength(unit, TYRE_WIDTH),
      wheelbase: optionalLength(unit, WHEELBASE),
      approach,
      promiseDate: z
        .string()
        .trim()
        .default("")
        .refine((typed) => typed === "" || isDate(typed), "That is not a date."),
      promiseTime: z
        .string()
        .trim()
        .default("")
        .refine((typed) => typed === "" || isTime(typed), "That is not a time of day."),
      template: z.enum(BUILD_TEMPLATE_IDS, { error: "Choose a list of stages." }),
      ...stageShape,
    })
    .refine((form) => !!form.customerId || !!form.customerName, {
      ...always,
      path: ["customerName"],
      message: "Whose vehicle is it? Choose a customer or write down a new one.",
    })
    .refine((form) => !form.promiseTime || !!form.promiseDate, {
      ...always,
      path: ["promiseDate"],
      message: "On which day? There is a time but no date.",
    })
    .refine((form) => PLACES.some((index) => isTicked(form, index)), {
      ...always,
      path: ["template"],
      message: "Leave at least one stage ticked.",
    })
    .transform((form) => {
      const template = BUILD_TEMPLATES[form.template].stages;
      const id = Number(form.customerId);
      return {
        customer:
          form.customerId === ""
            ? { id: null, name: form.customerName, phone: form.customerPhone, email: form.customerEmail }
            : { id: Number.isSafeInteger(id) ? id : 0 },
        kind: form.kind,
        nickname: form.nickname,
        length: form.length,
        width: form.width,
        wanted: form.wanted,
        tyre: form.tyre === "" ? null : form.tyre,
        loadedRadius: form.loadedRadius,
        tyreRadius: form.tyreRadius,
        tyreWidth: form.tyreWidth,
        wheelbase: form.wheelbase,
        approach: form.approach,
        /** As on the shop's clock. Without a time: the end of the working day. */
        promise:
          form.promiseDate === "" ? null : { date: form.promiseDate, time: form.promiseTime || PROMISE_TIME },
        template: form.template,
        stages: template.flatMap((line, index) =>
          isTicked(form, index) ? [{ index, hours: hoursOf(form, index) ?? line.hours }] : [],
        ),
      };
    });

/** A promise of a day alone is one for the end of it. */
export const PROMISE_TIME = "17:00";

export type BookIn = z.output<ReturnType<typeof bookInForm>>;

/**
 * What was measured and asked for, to be put right later.
 * @param unit what a bare number on a length field means in this shop
 */
export const askedForm = (unit: LengthUnit) =>
  z
    .object({
      wanted: text(2000, "Write down what the customer wants.").min(1, "Write down what the customer wants."),
      tyre: optionalText(40),
      loadedRadius: optionalLength(unit, RADIUS),
      tyreRadius: optionalLength(unit, RADIUS),
      tyreWidth: optionalLength(unit, TYRE_WIDTH),
      wheelbase: optionalLength(unit, WHEELBASE),
      approach,
    })
    .refine((form) => !form.loadedRadius || !form.tyreRadius || form.loadedRadius.mm <= form.tyreRadius.mm, {
      path: ["loadedRadius"],
      message: "Under load a tyre stands lower: the loaded radius is not more than the tyre's own.",
    });
export type Asked = z.output<ReturnType<typeof askedForm>>;
