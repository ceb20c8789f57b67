/** What a bay is fitted out for. */
export const BAY_KINDS = ["level-pad", "lift", "weld", "general", "apron"] as const;
export type BayKind = (typeof BAY_KINDS)[number];

/** What a bay kind is called on the floor. */
export const BAY_KIND_LABEL: Record<BayKind, string> = {
  "level-pad": "Level pad",
  lift: "Lift",
  weld: "Weld bay",
  general: "General",
  apron: "Apron",
};

/** Which way a bay is open to the aisle, seen on the plan (east is right). */
export const BAY_MOUTHS = ["east", "west", "north", "south"] as const;
export type BayMouth = (typeof BAY_MOUTHS)[number];
