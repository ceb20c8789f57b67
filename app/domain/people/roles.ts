/** What a person may be in the shop. A paired display is a device, not a person. */
export const ROLES = ["owner", "foreman", "tech", "counter"] as const;
export type Role = (typeof ROLES)[number];

/** Who may ask: a person in a role, a paired display, or a program with a token. */
export const ACTOR_ROLES = [...ROLES, "display", "token"] as const;
export type ActorRole = (typeof ACTOR_ROLES)[number];

/** What a person is able to do; a stage asks for one of them. */
export const SKILLS = ["strip", "level", "layout", "fabricate", "weld", "torque", "brakes"] as const;
export type Skill = (typeof SKILLS)[number];
