/** Worked examples of dimensions, as its page shows them. */
export const DIMENSIONS_EXAMPLES = [
  {
    title: "Wheelbase 100 in, tyres 16 in loaded: one low point of each kind",
    input: {
      front: {
        station: 2540,
        loadedRadius: 406.4,
      },
      rear: {
        station: 0,
        loadedRadius: 406.4,
      },
      points: [
        {
          station: 3302,
          height: 355.6,
        },
        {
          station: 1270,
          height: 254,
        },
        {
          station: -914.4,
          height: 508,
        },
      ],
    },
    output: {
      approach: {
        angle: 28.3369033,
        point: {
          station: 3302,
          height: 355.6,
        },
      },
      departure: {
        angle: 32.5542571,
        point: {
          station: -914.4,
          height: 508,
        },
      },
      ramp: {
        angle: 23.3647164,
        point: {
          station: 1270,
          height: 254,
        },
      },
      rules: [
        {
          name: "Directive 87/403/EEC (category G of M1, and N1 to 2 t)",
          status: "read" as const,
          isMet: null,
          missed: [],
          besides: "All-wheel drive, a differential lock, and 30 % of gradient alone.",
        },
        {
          name: "49 CFR 523.5(b)",
          status: "from memory" as const,
          isMet: null,
          missed: [],
          besides: "Four-wheel drive, or more than 6000 lb of gross weight.",
        },
      ],
    },
  },
  {
    title: "With clearances, against the off-road rules",
    input: {
      front: {
        station: 2700,
        loadedRadius: 375,
      },
      rear: {
        station: 0,
        loadedRadius: 375,
      },
      points: [
        {
          station: 3500,
          height: 420,
        },
        {
          station: 1350,
          height: 250,
        },
        {
          station: -900,
          height: 520,
        },
      ],
      clearances: {
        frontAxle: 210,
        rearAxle: 205,
        running: 250,
      },
    },
    output: {
      approach: {
        angle: 31.1247051,
        point: {
          station: 3500,
          height: 420,
        },
      },
      departure: {
        angle: 33.4427644,
        point: {
          station: -900,
          height: 520,
        },
      },
      ramp: {
        angle: 21.5339703,
        point: {
          station: 1350,
          height: 250,
        },
      },
      rules: [
        {
          name: "Directive 87/403/EEC (category G of M1, and N1 to 2 t)",
          status: "read" as const,
          isMet: true,
          missed: [],
          besides: "All-wheel drive, a differential lock, and 30 % of gradient alone.",
        },
        {
          name: "49 CFR 523.5(b)",
          status: "from memory" as const,
          isMet: true,
          missed: [],
          besides: "Four-wheel drive, or more than 6000 lb of gross weight.",
        },
      ],
    },
  },
];
