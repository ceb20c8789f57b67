import { cautionFor } from "../../../domain/layout/caution";
import type { StepId } from "../../../domain/layout/steps";
import { Sign } from "../../../ui/sign";

/** What can hurt somebody at this step. */
export function Cautions({ step }: { step: StepId }) {
  const cautions = cautionFor(step);
  if (cautions.length === 0) return null;
  return (
    <ul aria-label="Cautions" className="grid gap-1.5 text-[15px] text-concrete-700">
      {cautions.map((words) => (
        <li key={words} className="flex items-start gap-2.5">
          <Sign name="caution" size={20} className="mt-0.5 text-ink" />
          {words}
        </li>
      ))}
    </ul>
  );
}
