import type { VehicleKind } from "../../domain/builds/vehicle-kinds";
import { formatFeet, formatMillimetres, type LengthUnit, type Millimetres } from "../../domain/units/length";
import { parseLength } from "../../domain/units/parse-length";
import { Tape } from "../../ui/tape";
import { VehiclePlan } from "../vehicle-plan";

const inWords = (length: Millimetres, unit: LengthUnit) =>
  unit === "in" ? formatFeet(length) : formatMillimetres(length);

const read = (typed: string, unit: LengthUnit): Millimetres | null => {
  const length = typed.trim() === "" ? null : parseLength(typed, unit);
  return length?.ok && length.value >= 400 && length.value <= 30_000 ? length.value : null;
};

/** Room for the drawing on the narrowest phone. */
const WIDEST_PX = 290;
const TALLEST_PX = 150;

/** The vehicle as the Floor will draw it, from what has been typed so far. */
export function VehiclePreview({
  kind,
  nickname,
  length,
  width,
  unit,
}: {
  kind: VehicleKind | null;
  nickname: string;
  length: string;
  width: string;
  unit: LengthUnit;
}) {
  const [long, wide] = [read(length, unit), read(width, unit)];
  return (
    <figure className="grid justify-items-center gap-4 bg-concrete-200 p-6">
      {kind && long && wide ? (
        <>
          <div className="relative">
            <VehiclePlan
              kind={kind}
              lengthMm={long}
              widthMm={wide}
              scale={Math.min(WIDEST_PX / long, TALLEST_PX / wide)}
            />
            {nickname.trim() ? (
              <div className="absolute inset-0 grid place-items-center">
                <Tape name={nickname.trim()} />
              </div>
            ) : null}
          </div>
          <figcaption className="text-center">
            <b className="font-semibold">{inWords(long, unit)}</b> long,{" "}
            <b className="font-semibold">{inWords(wide, unit)}</b> wide
          </figcaption>
        </>
      ) : (
        <figcaption className="py-6 text-center text-concrete-700">
          Choose a kind: the vehicle is drawn here as it will lie on the Floor.
        </figcaption>
      )}
    </figure>
  );
}
