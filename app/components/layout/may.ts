/** What the person in front of the screen may do in a layout. */
export type May = { measure: boolean; approve: boolean };
