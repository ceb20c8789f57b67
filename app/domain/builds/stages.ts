import type { BayKind } from "../floor/bays";
import type { Skill } from "../people/roles";

/** The kinds of work that a build is cut into. */
export const STAGE_KINDS = [
  "strip",
  "level",
  "layout",
  "approval",
  "mock-up",
  "tack",
  "weld",
  "fit",
  "torque",
  "road-test",
  "hand-over",
] as const;
export type StageKind = (typeof STAGE_KINDS)[number];

export const STAGE_LABEL: Record<StageKind, string> = {
  strip: "Strip",
  level: "Level",
  layout: "Layout",
  approval: "Approval",
  "mock-up": "Mock-up",
  tack: "Tack",
  weld: "Weld",
  fit: "Fit springs",
  torque: "Torque",
  "road-test": "Road test",
  "hand-over": "Ready",
};

const ON_A_LEVEL: readonly StageKind[] = [
  // Somebody who levels before Strip is ticked off has a level to lose all the same.
  "strip",
  "level",
  "layout",
  "approval",
  "mock-up",
  "tack",
  "weld",
];

/** Does work at this stage lean on the level? Once the brackets are welded a moved vehicle loses nothing. */
export const leansOnLevel = (kind: StageKind): boolean => ON_A_LEVEL.includes(kind);

export const STAGE_STATES = ["open", "under-way", "done"] as const;
export type StageState = (typeof STAGE_STATES)[number];

/** One line of a template: what the stage asks for. `bayKinds` empty means any bay. */
export type StageTemplate = {
  kind: StageKind;
  hours: number;
  bayKinds: readonly BayKind[];
  skill: Skill | null;
  heads: number;
  /** Stages with the same letter belong to one unbroken stay: the vehicle is not moved between them. */
  stay: string | null;
};

/**
 * Which bays a stage may be done in. Empty: any.
 * Level, layout and approval need a floor that is rated for it; welding needs a weld bay or the pad it stands on.
 * Source: common practice, no source.
 */
export const BAYS_FOR_STAGE: Record<StageKind, readonly BayKind[]> = {
  strip: [],
  level: ["level-pad"],
  layout: ["level-pad"],
  approval: [],
  "mock-up": ["level-pad", "weld"],
  tack: ["level-pad", "weld"],
  weld: ["weld", "level-pad"],
  fit: ["lift", "level-pad", "weld", "general"],
  torque: [],
  "road-test": [],
  "hand-over": [],
};

export const SKILL_FOR_STAGE: Record<StageKind, Skill | null> = {
  strip: "strip",
  level: "level",
  layout: "layout",
  approval: null,
  "mock-up": "fabricate",
  tack: "weld",
  weld: "weld",
  fit: "fabricate",
  torque: "torque",
  "road-test": null,
  "hand-over": null,
};

const stage = (kind: StageKind, hours: number, heads = 1, stay: string | null = null): StageTemplate => ({
  kind,
  hours,
  bayKinds: BAYS_FOR_STAGE[kind],
  skill: SKILL_FOR_STAGE[kind],
  heads,
  stay,
});

/** Ready-made stage lists for booking in. Hours: common practice, no source. */
export const BUILD_TEMPLATES = {
  "front-leaf": {
    label: "Front leaf springs re-hung",
    stages: [
      stage("strip", 3),
      stage("level", 1.5, 1, "A"),
      stage("layout", 4, 2, "A"),
      stage("approval", 1, 1, "A"),
      stage("mock-up", 6, 2, "A"),
      stage("tack", 3, 1, "A"),
      stage("weld", 5),
      stage("fit", 4),
      stage("torque", 2),
      stage("road-test", 1),
      stage("hand-over", 0.5),
    ],
  },
  "springs-only": {
    label: "Springs and shackles, hangers stay",
    stages: [
      stage("strip", 2),
      stage("fit", 5),
      stage("torque", 2),
      stage("road-test", 1),
      stage("hand-over", 0.5),
    ],
  },
  "weld-repair": {
    label: "Hanger or bracket repair",
    stages: [
      stage("strip", 2),
      stage("level", 1.5, 1, "A"),
      stage("layout", 2, 1, "A"),
      stage("weld", 6),
      stage("torque", 2),
      stage("hand-over", 0.5),
    ],
  },
} as const satisfies Record<string, { label: string; stages: readonly StageTemplate[] }>;
export type BuildTemplateId = keyof typeof BUILD_TEMPLATES;
export const BUILD_TEMPLATE_IDS = Object.keys(BUILD_TEMPLATES) as [BuildTemplateId, ...BuildTemplateId[]];

/** Why work may not go on. */
export const HOLD_KINDS = ["parts", "customer", "level-void", "safety"] as const;
export type HoldKind = (typeof HOLD_KINDS)[number];
export const HOLD_LABEL: Record<HoldKind, string> = {
  parts: "Waiting for parts",
  customer: "Waiting for the customer",
  "level-void": "Level void",
  safety: "Safety",
};
