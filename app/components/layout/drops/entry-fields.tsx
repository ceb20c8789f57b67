import type { Ref } from "react";
import type { LayoutView } from "../../../domain/layout/view";
import { ReadingField } from "../reading-field";
import type { Draft } from "../use-draft";
import type { Spot } from "./cells";
import type { EntryRead, Method } from "./entry-read";
import { wouldFitWords } from "./trouble";

export type FieldName = string;
/** One entry of a drop: its field, its label, and whether the reading needs it. */
export type EntryField = { name: FieldName; label: string; what: string; short: string; wanted: boolean };

/** The entries of a drop in the order in which they are read. */
export function fieldsOf(view: LayoutView, spot: Spot, method: Method, withHeight: boolean): EntryField[] {
  const height = {
    name: "height",
    label: "Height above the ground at ride",
    what: "Height at ride",
    short: "its height",
    wanted: true,
  };
  const place: EntryField[] =
    method === "offset"
      ? [
          {
            name: "station",
            label: "Ahead of A",
            what: "Ahead of A, along the line",
            short: "ahead of A",
            wanted: true,
          },
          {
            name: "offset",
            label: "Off the line",
            what: spot.side === "centre" ? "Off the line, left is plus" : `Off the line, to the ${spot.side}`,
            short: "off the line",
            wanted: true,
          },
        ]
      : view.bay.marks.map((mark, i) => ({
          name: `tape.${mark.label}`,
          label: `Tape from ${mark.label}`,
          what: `Tape from mark ${mark.label}`,
          short: `the tape from ${mark.label}`,
          wanted: i < 3,
        }));
  return withHeight ? [...place, height] : place;
}

type Props = {
  view: LayoutView;
  spot: Spot;
  fields: readonly EntryField[];
  draft: Draft;
  read: EntryRead;
  errors: Record<string, string>;
  inHand: string | null;
  padUp: boolean;
  rootRef: Ref<HTMLDivElement>;
  change: (changes: Draft) => void;
  onHand: (name: string) => void;
  onKeep: () => void;
};

/** The tapes, or the place along and off the line, side by side. */
export function EntryFields({
  view,
  spot,
  fields,
  draft,
  read,
  errors,
  inHand,
  padUp,
  rootRef,
  change,
  onHand,
  onKeep,
}: Props) {
  return (
    <div className="drop-fields" ref={rootRef}>
      {fields.map(({ name, label }) => {
        const mark = name.startsWith("tape.") ? name.slice(5) : null;
        const fits = mark ? tapeWords(read, mark, view.unit) : null;
        return (
          <div
            key={name}
            className="drop-field"
            data-in-hand={inHand === name}
            data-off={fits !== null && isSuggested(read, mark)}
          >
            {mark ? (
              <span className="drop-mark" aria-hidden="true">
                {mark}
              </span>
            ) : null}
            <ReadingField
              label={label}
              name={name}
              value={draft[name] ?? ""}
              onChange={(value) => change({ [name]: value })}
              onHand={() => onHand(name)}
              onKeep={onKeep}
              padUp={padUp}
              error={errors[name]}
              hint={
                fits ??
                (name === "offset" && spot.side !== "centre"
                  ? `to the ${spot.side}`
                  : name === "offset"
                    ? "left is plus"
                    : undefined)
              }
              size="l"
            />
          </div>
        );
      })}
    </div>
  );
}

const isSuggested = (read: EntryRead, mark: string | null): boolean =>
  read.fit?.suggestions.length === 1 && read.fit.suggestions[0]?.mark === mark;

function tapeWords(read: EntryRead, mark: string, unit: LayoutView["unit"]): string | null {
  if (!read.fit?.suspect) return null;
  const residual = read.fit.residuals.find((one) => one.mark === mark);
  const tie = read.ties.find((one) => one.mark === mark);
  return residual && tie ? wouldFitWords(tie.distance, residual.wouldFit, unit) : null;
}
