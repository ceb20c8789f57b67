/** Placeholder until the step lands. */
export function OptionsStep(_props: Record<string, unknown>) {
  return null;
}
