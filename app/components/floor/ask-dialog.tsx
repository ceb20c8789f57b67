import { Button } from "../../ui/button";
import { Dialog } from "../../ui/dialog";
import { focusThing } from "./slide-home";
import { type Asked, thingKey } from "./use-floor";

/** Before a move that costs something: what is lost, with the safe answer in focus. */
export function AskDialog({ asked, onClose }: { asked: Asked; onClose: () => void }) {
  const close = () => {
    onClose();
    requestAnimationFrame(() => focusThing(thingKey(asked.thing)));
  };
  const go = () => {
    close();
    asked.confirm();
  };
  return (
    <Dialog
      title={asked.title}
      open
      onClose={close}
      sign="question"
      tone="ask"
      actions={
        <>
          <Button tone="ink" data-autofocus onClick={close}>
            {asked.keep}
          </Button>
          <Button onClick={go}>{asked.go}</Button>
        </>
      }
    >
      {asked.loss.map((words) => (
        <p key={words}>{words}</p>
      ))}
    </Dialog>
  );
}
