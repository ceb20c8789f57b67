/** Worked examples of driveline, as its page shows them. */
export const DRIVELINE_EXAMPLES = [
  {
    title: "A rear shaft at ride, droop and full compression, at 3000 rpm",
    input: {
      box: {
        x: 0,
        y: 0,
        z: 500,
      },
      output: {
        side: 3,
      },
      places: [
        {
          name: "ride",
          joint: {
            x: -1200,
            y: 0,
            z: 420,
          },
          pinion: {
            side: 3,
          },
        },
        {
          name: "droop",
          joint: {
            x: -1190,
            y: 0,
            z: 320,
          },
          pinion: {
            side: 4,
          },
        },
        {
          name: "full compression",
          joint: {
            x: -1203,
            y: 0,
            z: 500,
          },
          pinion: {
            side: 2,
          },
        },
      ],
      rpm: 3000,
    },
    output: {
      places: [
        {
          name: "ride",
          length: 1202.66371,
          first: 0.814074834,
          second: 0.814074834,
          residual: 0,
          unevenness: 0,
          mostLag: 0.00289174936,
          peakAcceleration: 19.9249737,
          words: [],
        },
        {
          name: "droop",
          length: 1203.53646,
          first: 5.60138486,
          second: 4.60138486,
          residual: 3.19417747,
          unevenness: 0.00310955386,
          mostLag: 0.137119999,
          peakAcceleration: 944.821846,
          words: [
            "The first joint works at 5.60°: over 3° it is felt.",
            "The second joint works at 4.60°: over 3° it is felt.",
          ],
        },
        {
          name: "full compression",
          length: 1203,
          first: 3,
          second: 2,
          residual: 2.23606798,
          unevenness: 0.00152347404,
          mostLag: 0.0392878617,
          peakAcceleration: 270.705128,
          words: [],
        },
      ],
      longest: 1203.53646,
      shortest: 1202.66371,
      slip: 0.872745348,
      makersLimit: {
        rpm: 3000,
        angle: 5.8,
        status: "from memory" as const,
      },
    },
  },
  {
    title: "Offset in plan and side: the angle in space",
    input: {
      box: {
        x: 0,
        y: 0,
        z: 500,
      },
      output: {
        side: 0,
      },
      places: [
        {
          name: "ride",
          joint: {
            x: -1000,
            y: 52.4,
            z: 430.1,
          },
          pinion: {
            side: 0,
          },
        },
      ],
    },
    output: {
      places: [
        {
          name: "ride",
          length: 1003.80863,
          first: 4.99268417,
          second: 4.99268417,
          residual: 0,
          unevenness: 0,
          mostLag: 0.108901956,
          peakAcceleration: null,
          words: [
            "The first joint works at 4.99°: over 3° it is felt.",
            "The second joint works at 4.99°: over 3° it is felt.",
          ],
        },
      ],
      longest: 1003.80863,
      shortest: 1003.80863,
      slip: 0,
      makersLimit: null,
    },
  },
];
