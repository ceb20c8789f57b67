/** How sure the expected value is. */
export type Status =
  /** The page with the value was read. */
  | "read"
  /** The value was remembered or read in part, and the published formula and inputs give it again. */
  | "recomputed"
  /** From memory of the book named; the page was not seen. */
  | "from memory"
  /** Worked out from the named formula; no printed value was seen. */
  | "derived"
  /** Another library's answer, worked out in the test. */
  | "library"
  /** The trade does it so; no source. Then `source.name` is "common practice, no source". */
  | "practice";

export type Source = {
  /** The work, the same words in every check that uses it: it is counted. */
  name: string;
  /** Page, example, table, address. */
  place?: string;
  status: Status;
};

export type Check = {
  /** What is checked, with the inputs, so that a reader can do it by hand. */
  about: string;
  source: Source;
  got: () => number | readonly number[] | string;
  want: number | readonly number[] | string;
  /** Largest difference allowed: half a unit of the last printed place. Left out for texts. */
  within?: number;
};

/** The checks of one topic, in one table. */
export type Topic = { topic: string; checks: readonly Check[] };
