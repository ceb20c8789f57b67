import type { LayoutView } from "../../../domain/layout/view";
import { isWhole, linesOf, nextLine } from "../../../domain/layout/work-list";
import { Verdict } from "../../../ui/verdict";
import type { May } from "../may";
import { failedLines, statesIn } from "./signed";
import { WorkDesk } from "./work-desk";

type Props = { view: LayoutView; may: May; person: string; shut: boolean; done: () => void };

const AT_WELD = "Heat pulls: short runs from side to side keep the axle where it was checked.";
const AT_TORQUE =
  "Torque with the bushings at ride height: clamped at droop they tear once it stands on its wheels. The torque is the parts maker's, typed from their paper.";

/** Every bracket signed by a welder, then every bolt by whoever torqued it, then what has to be free to move. */
export function WeldStep({ view, may, person, shut, done }: Props) {
  const welded = isWhole(view.work.progress.weld);
  return (
    <>
      {shut ? null : <WeldVerdict view={view} />}
      <WorkDesk
        view={view}
        may={may}
        person={person}
        done={done}
        lists={welded ? ["torque", "weld"] : ["weld", "torque"]}
        caution={welded ? AT_TORQUE : AT_WELD}
        next={{ to: "finish", label: "Go to Finish" }}
      />
    </>
  );
}

function WeldVerdict({ view }: { view: LayoutView }) {
  const { weld, torque } = view.work.progress;
  const failed = failedLines(view, ["weld", "torque"]);
  const next = nextLine("weld", statesIn(view)) ?? nextLine("torque", statesIn(view));
  const far = `${weld.done} of ${weld.of} brackets, ${torque.done} of ${torque.of} torqued or looked at.`;
  if (failed)
    return (
      <Verdict
        tone="not-true"
        sign="off"
        size="l"
        title={failed}
        detail={`It keeps this step open. ${far}`}
        live
      />
    );
  if (isWhole(weld) && isWhole(torque))
    return (
      <Verdict
        tone="true"
        sign="welded"
        size="l"
        title="Welded, torqued, free to move."
        detail={`All ${linesOf("weld").length + linesOf("torque").length} lines are signed.`}
        live
      />
    );
  return (
    <Verdict
      tone="kept"
      sign={isWhole(weld) ? "torque" : "welded"}
      size="l"
      title={
        isWhole(weld)
          ? `${torque.done} of ${torque.of} torqued or looked at.`
          : `${weld.done} of ${weld.of} brackets welded and signed.`
      }
      detail={next ? `Next: ${next.label}.` : undefined}
      live
    />
  );
}
