import type { Modifier } from "@dnd-kit/core";
import { noseInset } from "./geometry";
import type { PlaceKey } from "./words";

/** Where a vehicle would stand in a place, on the screen; null where several stand, or where one stands already. */
function standIn(place: PlaceKey, width: number, height: number): { left: number; top: number } | null {
  const bay = document.querySelector<HTMLElement>(`.bay[data-place="${place}"]`);
  const stand = bay?.querySelector(".bay-stand");
  if (!bay || !stand) return null;
  const home = bay.querySelector<HTMLElement>('.standing[data-left="true"]');
  if (home) return home.getBoundingClientRect();
  if (bay.querySelector(".standing")) return null;
  const box = stand.getBoundingClientRect();
  const edge = bay.getBoundingClientRect();
  const mouth = bay.dataset.mouth;
  if (mouth !== "east" && mouth !== "west") return null;
  const ft = Number.parseFloat(getComputedStyle(bay).getPropertyValue("--ft"));
  const inset = noseInset((edge.width - width) / ft) * ft;
  return {
    left: mouth === "east" ? edge.left + inset : edge.right - inset - width,
    top: box.top + (box.height - height) / 2,
  };
}

/** Over an empty bay the vehicle in hand lies where it would stand, so that what is too long is seen to be. */
export const snapToStand: Modifier = ({ transform, over, active, draggingNodeRect }) => {
  const place = over?.data.current?.place as PlaceKey | undefined;
  if (place === undefined || !draggingNodeRect || active?.data.current?.hand?.kind !== "vehicle")
    return transform;
  const at = standIn(place, draggingNodeRect.width, draggingNodeRect.height);
  return at
    ? { ...transform, x: at.left - draggingNodeRect.left, y: at.top - draggingNodeRect.top }
    : transform;
};
