import type { LayoutView } from "../../../domain/layout/view";
import type { Draft } from "../use-draft";

/** What both ways of levelling are handed. */
export type LevelWay = {
  view: LayoutView;
  draft: Draft;
  change: (changes: Draft) => void;
  /** Words beside the fields, by name. */
  fields: Record<string, string>;
  readOnly: boolean;
  busy: boolean;
  /** Sends what is typed for the verdict that counts. */
  check: () => void;
  pad: { padUp: boolean; setPad: (up: boolean) => void };
};
