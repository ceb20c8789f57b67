import { useCallback, useState } from "react";
import { useNavigate, useRevalidator } from "react-router";
import { useFloorView } from "./floor-context";
import { type Answered, post } from "./post";

export type Doing = {
  /** Which action is under way; null when none is. */
  busy: string | null;
  /** Why the last action was refused; null when it was not. */
  words: string | null;
  /** Words beside the fields of what was refused. */
  fields: Record<string, string>;
  run: (name: string, path: string, fields: Record<string, string | number>) => Promise<Answered>;
  startLayout: (buildId: number) => Promise<void>;
};

/** Runs the panel's actions one at a time and keeps what was said about the last one. */
export function useDoing(): Doing {
  const { floor } = useFloorView();
  const { say } = floor;
  const { revalidate } = useRevalidator();
  const navigate = useNavigate();
  const [busy, setBusy] = useState<string | null>(null);
  const [refusal, setRefusal] = useState<{ words: string; fields: Record<string, string> } | null>(null);

  const run = useCallback(
    async (name: string, path: string, fields: Record<string, string | number>) => {
      setBusy(name);
      setRefusal(null);
      const answer = await post(path, fields);
      if (answer.ok) {
        if (answer.words) say(`${answer.words}.`);
        await revalidate();
      } else setRefusal({ words: answer.message, fields: answer.fields });
      setBusy(null);
      return answer;
    },
    [revalidate, say],
  );

  const startLayout = useCallback(
    async (buildId: number) => {
      const answer = await run("layout", `/builds/${buildId}/layout`, { fixedEye: "ahead" });
      if (answer.ok && typeof answer.layoutId === "number") await navigate(`/layouts/${answer.layoutId}`);
    },
    [navigate, run],
  );

  return { busy, words: refusal?.words ?? null, fields: refusal?.fields ?? {}, run, startLayout };
}
