import { dayAndDate } from "../time";
import { ScanField } from "./scan-field";

export type WhyNot =
  | { state: "unreadable"; words: string }
  | { state: "unknown" }
  | { state: "replaced"; nickname: string; replacedAt: string }
  | { state: "gone"; nickname: string };

function wordsFor(why: WhyNot, typed: string, timeZone: string): { head: string; help: string } {
  switch (why.state) {
    case "unreadable":
      return { head: "That is not a tag of ours.", help: why.words };
    case "unknown":
      return {
        head: `No vehicle carries ${typed}.`,
        help: "Look at the tag again: one sign may be read wrong. If it is right, the tag is another shop's.",
      };
    case "replaced":
      return {
        head: `That tag of ${why.nickname} was replaced.`,
        help: `A new one was made on ${dayAndDate(why.replacedAt, timeZone)}. Take this one off, and scan the one that hangs on the vehicle.`,
      };
    case "gone":
      return {
        head: `${why.nickname} is not here.`,
        help: "Its last build has left the shop. If it stands in front of you, the counter has to book it in again.",
      };
  }
}

/** The page for a tag that leads nowhere: why, and the field again. */
export function NoSuchTag({ typed, why, timeZone }: { typed: string; why: WhyNot; timeZone: string }) {
  const { head, help } = wordsFor(why, typed, timeZone);
  return (
    <main className="mx-auto grid w-full max-w-xl content-start gap-6 p-6 pt-12">
      <div className="grid gap-2">
        <p className="label">Tag {typed}</p>
        <h1 className="font-label font-semibold text-4xl leading-tight">{head}</h1>
        <p className="text-lg">{help}</p>
      </div>
      <ScanField typed={typed} focus />
    </main>
  );
}
