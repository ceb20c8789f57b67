/** Placeholder until the step lands. */
export function AxleLineStep(_props: Record<string, unknown>) {
  return null;
}
