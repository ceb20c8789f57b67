/** What the person in front of the screen may do in a layout. */
export type May = {
  measure: boolean;
  approve: boolean;
  /** Why they may not sign a weld, in words; null when they may. */
  whyNoWeld: string | null;
};
