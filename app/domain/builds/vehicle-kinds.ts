/** Vehicles are described by what they are, never by who made them. */
export const VEHICLE_KINDS = [
  "short-bed-pickup",
  "long-bed-pickup",
  "crew-pickup",
  "flatbed",
  "two-door-utility",
  "wagon",
  "open-top",
  "buggy",
  "bare-chassis",
] as const;
export type VehicleKind = (typeof VEHICLE_KINDS)[number];

/** Words and usual outside sizes, in inches; sizes are starting values for the form (common practice, no source). */
export const VEHICLE_KIND: Record<VehicleKind, { label: string; lengthIn: number; widthIn: number }> = {
  "short-bed-pickup": { label: "Short-bed pickup", lengthIn: 189, widthIn: 75 },
  "long-bed-pickup": { label: "Long-bed pickup", lengthIn: 230, widthIn: 76 },
  "crew-pickup": { label: "Crew-cab pickup", lengthIn: 241, widthIn: 76 },
  flatbed: { label: "Flatbed", lengthIn: 211, widthIn: 78 },
  "two-door-utility": { label: "Two-door utility", lengthIn: 162, widthIn: 75 },
  wagon: { label: "Wagon", lengthIn: 197, widthIn: 75 },
  "open-top": { label: "Open-top utility", lengthIn: 141, widthIn: 73 },
  buggy: { label: "Tube buggy", lengthIn: 136, widthIn: 72 },
  "bare-chassis": { label: "Bare chassis", lengthIn: 194, widthIn: 75 },
};
