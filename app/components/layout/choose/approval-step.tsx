/** Placeholder until the step lands. */
export function ApprovalStep(_props: Record<string, unknown>) {
  return null;
}
