/** Worked examples of tyre, as its page shows them. */
export const TYRE_EXAMPLES = [
  {
    title: "A metric size with load and speed",
    input: {
      size: "LT285/75R16 121/118Q",
      rollingRadius: 405,
    },
    output: {
      system: "metric" as const,
      service: "LT" as const,
      width: 285,
      sectionHeight: 213.75,
      rimInches: 16,
      diameter: 833.9,
      ruleDiameter: 834,
      loadKilograms: 1450,
      speedKilometresPerHour: 160,
      turnsPerKilometre: 392.975168,
    },
  },
  {
    title: "A flotation size",
    input: {
      size: "35x12.50R15LT",
    },
    output: {
      system: "flotation" as const,
      service: "LT" as const,
      width: 317.5,
      sectionHeight: 254,
      rimInches: 15,
      diameter: 889,
      ruleDiameter: null,
      loadKilograms: null,
      speedKilometresPerHour: null,
      turnsPerKilometre: null,
    },
  },
];
