import { useRef, useState } from "react";
import { type PostAnswer, post } from "./post";

export type Sending = {
  busy: boolean;
  /** Not sent, or not taken, in words; null: nothing is wrong. */
  trouble: string | null;
  /** Words beside the fields, by name. */
  fields: Record<string, string>;
  send: (to: string, fields: Record<string, string>) => Promise<PostAnswer | null>;
  clear: () => void;
};

const NO_LINK = "No signal: kept here, not sent. Press again when the link is back.";

/**
 * One post at a time: a second press while the first is on its way does nothing.
 * @param done called after the shop took it, to read the page again
 */
export function usePost(done: () => void): Sending {
  const onTheWay = useRef(false);
  const [state, setState] = useState<Pick<Sending, "busy" | "trouble" | "fields">>({
    busy: false,
    trouble: null,
    fields: {},
  });
  const send: Sending["send"] = async (to, fields) => {
    if (onTheWay.current) return null;
    onTheWay.current = true;
    setState({ busy: true, trouble: null, fields: {} });
    const posted = await post(to, fields);
    onTheWay.current = false;
    if (posted.state === "answered") {
      const { answer } = posted;
      setState({
        busy: false,
        trouble: answer.ok ? null : answer.message,
        fields: answer.ok ? {} : answer.fields,
      });
      done();
      return answer;
    }
    setState({ busy: false, trouble: posted.state === "no-link" ? NO_LINK : posted.words, fields: {} });
    return null;
  };
  return { ...state, send, clear: () => setState({ busy: false, trouble: null, fields: {} }) };
}
