import { useState } from "react";
import {
  BUILD_TEMPLATE_IDS,
  BUILD_TEMPLATES,
  type BuildTemplateId,
  STAGE_LABEL,
  type StageTemplate,
} from "../../domain/builds/stages";
import { BAY_KIND_LABEL } from "../../domain/floor/bays";
import { SelectField } from "../../ui/field";
import { Sign } from "../../ui/sign";
import { stageSign } from "../floor/bay-rows";

const templateOf = (id: string | undefined): BuildTemplateId =>
  BUILD_TEMPLATE_IDS.find((known) => known === id) ?? "front-leaf";
const hoursOf = (typed: string) => Number(typed.replace(",", ".")) || 0;

type Line = { ticked: boolean; hours: string };

/** The lines of a list as they stand at first, or as they were typed before a refusal. */
function linesOf(template: BuildTemplateId, typed: Record<string, string> | null): Line[] {
  return BUILD_TEMPLATES[template].stages.map((stage, index) => ({
    ticked: typed === null || typed[`stage-${index}`] !== undefined,
    hours: typed?.[`hours-${index}`] ?? String(stage.hours),
  }));
}

/** A list of stages to start from; a stage is unticked, its hours are changed. */
export function StagePick({
  typed,
  faults,
}: {
  typed: Record<string, string>;
  faults: Record<string, string>;
}) {
  const before = typed.template === undefined ? null : typed;
  const [template, setTemplate] = useState(templateOf(typed.template));
  const [lines, setLines] = useState(() => linesOf(template, before));
  const change = (index: number, line: Partial<Line>) =>
    setLines((all) => all.map((old, at) => (at === index ? { ...old, ...line } : old)));
  const total = lines.reduce((sum, line) => sum + (line.ticked ? hoursOf(line.hours) : 0), 0);
  const stages: readonly StageTemplate[] = BUILD_TEMPLATES[template].stages;
  return (
    <div className="grid gap-4">
      <SelectField
        label="List of stages"
        name="template"
        value={template}
        error={faults.template}
        onChange={(event) => {
          const next = templateOf(event.target.value);
          setTemplate(next);
          setLines(linesOf(next, null));
        }}
      >
        {BUILD_TEMPLATE_IDS.map((id) => (
          <option key={id} value={id}>
            {BUILD_TEMPLATES[id].label}
          </option>
        ))}
      </SelectField>
      <ul className="grid border-concrete-200 border-t">
        {stages.map((stage, index) => (
          <StageRow
            key={stage.kind}
            stage={stage}
            begins={stage.stay !== null && stages[index - 1]?.stay !== stage.stay}
            index={index}
            line={lines[index] ?? { ticked: true, hours: "" }}
            fault={faults[`hours-${index}`]}
            change={change}
          />
        ))}
      </ul>
      <p className="flex justify-between font-semibold">
        <span>
          {lines.filter((line) => line.ticked).length} of {lines.length} stages
        </span>
        <output aria-label="Hours in all">{Math.round(total * 100) / 100} h</output>
      </p>
    </div>
  );
}

const inAnyOf = (words: string[]) =>
  words.length < 2 ? words.join("") : `${words.slice(0, -1).join(", ")} or ${words[words.length - 1]}`;

function needs(stage: StageTemplate, begins: boolean): string {
  const where = inAnyOf(stage.bayKinds.map((kind) => BAY_KIND_LABEL[kind].toLowerCase()));
  const heads = stage.heads > 1 ? `${stage.heads} people` : "";
  return [where, heads, begins ? "from here on it is not moved" : ""].filter(Boolean).join("; ");
}

function StageRow({
  stage,
  begins,
  index,
  line,
  fault,
  change,
}: {
  stage: StageTemplate;
  /** An unbroken stay begins with this stage. */
  begins: boolean;
  index: number;
  line: Line;
  fault: string | undefined;
  change: (index: number, line: Partial<Line>) => void;
}) {
  const label = STAGE_LABEL[stage.kind];
  const faultId = `hours-${index}-fault`;
  return (
    <li
      className={`border-concrete-200 border-b border-l-4 pl-2 ${stage.stay ? "border-l-brass" : "border-l-transparent"}`}
    >
      <div className="flex min-h-12 items-center gap-3">
        <label
          className={`flex min-h-12 min-w-0 grow cursor-pointer items-center gap-3 ${line.ticked ? "" : "text-concrete-500"}`}
        >
          <input
            type="checkbox"
            name={`stage-${index}`}
            aria-label={label}
            checked={line.ticked}
            onChange={(event) => change(index, { ticked: event.target.checked })}
            className="size-5 shrink-0 accent-brass-ink"
          />
          <Sign name={stageSign(stage.kind)} size={20} />
          <span className="min-w-0">
            <span className={line.ticked ? "font-semibold" : "line-through"}>{label}</span>{" "}
            <span className="text-[15px] text-concrete-500">{needs(stage, begins)}</span>
          </span>
        </label>
        <span className="flex shrink-0 items-center gap-1.5">
          <input
            name={`hours-${index}`}
            aria-label={`Hours for ${label}`}
            aria-invalid={fault !== undefined || undefined}
            aria-describedby={fault ? faultId : undefined}
            value={line.hours}
            disabled={!line.ticked}
            inputMode="decimal"
            autoComplete="off"
            onChange={(event) => change(index, { hours: event.target.value })}
            className="h-11 w-16 rounded-[3px] border border-paint-edge bg-chalk px-2 text-right disabled:border-concrete-200 disabled:text-concrete-300 aria-invalid:border-2 aria-invalid:border-oxide"
          />
          h
        </span>
      </div>
      {fault ? (
        <p id={faultId} className="pb-2 text-right font-medium text-oxide">
          {fault}
        </p>
      ) : null}
    </li>
  );
}
