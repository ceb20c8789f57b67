import { useState } from "react";
import { Button } from "../../../ui/button";
import { Sign } from "../../../ui/sign";
import { ReadingField } from "../reading-field";
import type { Draft } from "../use-draft";
import type { Place } from "./heights";

type Props = {
  places: readonly Place[];
  draft: Draft;
  /** Whether it stands open when it is first shown; after that only a press opens or shuts it. */
  openAtFirst: boolean;
  readOnly: boolean;
  fields: Record<string, string>;
  change: (changes: Draft) => void;
  addStand: (() => void) | null;
};

/** Where the stands are under the frame. Remembered from check to check; a slope is only as good as these. */
export function StandPlaces({ places, draft, openAtFirst, readOnly, fields, change, addStand }: Props) {
  const [open, setOpen] = useState(openAtFirst);
  const shared = (name: "x" | "y", value: string) =>
    change(
      Object.fromEntries(
        places
          .filter((place) => !place.id.startsWith("extra"))
          .map((place) => [`${name}.${place.id}`, name === "x" && place.id.endsWith("rear") ? "0" : value]),
      ),
    );
  return (
    <details
      className="border-t border-concrete-300 bg-chalk"
      open={open}
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="flex min-h-12 items-center gap-2 px-4 font-semibold">
        <Sign name="stand" size={22} /> Where the stands are
      </summary>
      <div className="grid gap-4 px-4 pb-4">
        <p className="max-w-2xl text-[15px] text-concrete-700">
          All in a rectangle? Type it once here. Otherwise each stand for itself, ahead of the rear pair and
          out from the frame's centre line.
        </p>
        {readOnly ? null : (
          <div className="grid max-w-xl gap-4 sm:grid-cols-2">
            <ReadingField
              label="Front stands ahead of the rear ones"
              name="along"
              value={draft["x.left-front"] === draft["x.right-front"] ? (draft["x.left-front"] ?? "") : ""}
              onChange={(value) => shared("x", value)}
              padUp={false}
            />
            <ReadingField
              label="Every stand out from the centre line"
              name="across"
              value={draft["y.left-front"] === draft["y.right-front"] ? (draft["y.left-front"] ?? "") : ""}
              onChange={(value) => shared("y", value)}
              padUp={false}
            />
          </div>
        )}
        <ul className="grid gap-3 md:grid-cols-2">
          {places.map((place) => (
            <li key={place.id} className="grid grid-cols-2 gap-3 border-t border-concrete-200 pt-2">
              {(["x", "y"] as const).map((axis) => (
                <ReadingField
                  key={axis}
                  label={`${place.label}: ${axis === "x" ? "ahead" : place.id.startsWith("extra") ? "across, left is plus" : `out to the ${place.side}`}`}
                  name={`${axis}.${place.id}`}
                  value={draft[`${axis}.${place.id}`] ?? ""}
                  onChange={(value) => change({ [`${axis}.${place.id}`]: value })}
                  error={fields[`${axis}.${place.id}`]}
                  readOnly={readOnly}
                  padUp={false}
                />
              ))}
            </li>
          ))}
        </ul>
        {addStand ? (
          <div className="flex flex-wrap gap-3">
            <Button size="l" onClick={() => setOpen(false)}>
              Done
            </Button>
            <Button size="l" tone="quiet" onClick={addStand}>
              Add a stand
            </Button>
          </div>
        ) : null}
      </div>
    </details>
  );
}
