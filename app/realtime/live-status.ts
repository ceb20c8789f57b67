/** `joining`: the first connection is being made. `live`: heard within the last seconds. `not-live`: not heard. */
export type LiveState = "joining" | "live" | "not-live";
/** How live a screen is, and when the shop was last heard (milliseconds since 1970; null: never). */
export type LiveStatus = { state: LiveState; lastHeard: number | null };
