/** Worked examples of survey, as its page shows them. */
export const SURVEY_EXAMPLES = [
  {
    title: "A bay that rises 4 mm/m to the left, with a bump, and two stands",
    input: {
      heights: [
        { x: 0, y: -1000, height: 6 },
        { x: 0, y: 0, height: 10 },
        { x: 0, y: 1000, height: 14 },
        { x: 1500, y: -1000, height: 6 },
        { x: 1500, y: 0, height: 13 },
        { x: 1500, y: 1000, height: 14 },
        { x: 3000, y: -1000, height: 6 },
        { x: 3000, y: 0, height: 10 },
        { x: 3000, y: 1000, height: 14 },
      ],
      stands: [
        { id: "left front", x: 2800, y: 400 },
        { id: "right front", x: 2800, y: -400 },
      ],
      shim: 1,
    },
    output: {
      riseAlong: 0,
      riseAcross: 4,
      steepest: 4,
      slope: 0.229182,
      rises: 90,
      words: "The floor rises 4.0 mm/m to the left.",
      flatness: 3,
      bump: { x: 1500, y: 0, deviation: 2.66667 },
      hollow: { x: 0, y: -1000, deviation: -0.333333 },
      deviations: [
        -0.333333, -0.333333, -0.333333, -0.333333, 2.66667, -0.333333, -0.333333, -0.333333, -0.333333,
      ],
      rating: "usable" as const,
      ratingWords: "Usable with shims under the stands: 4.0 mm/m and 3.0 mm from bump to hollow.",
      shims: [
        { id: "left front", low: 0, shim: 0 },
        { id: "right front", low: 3.2, shim: 3 },
      ],
      fNumbers: null,
    },
  },
  {
    title: "A line of fourteen heights, every 300 mm: flatness number",
    input: {
      heights: [
        { x: 0, y: 0, height: 0 },
        { x: 1000, y: 0, height: 0.5 },
        { x: 0, y: 1000, height: -0.5 },
        { x: 1000, y: 1000, height: 0.25 },
      ],
      lines: [
        [
          418.617, 419.938, 421.894, 423.748, 425.221, 424.739, 423.799, 424.307, 425.425, 424.688, 423.164,
          422.758, 420.472, 416.738,
        ],
      ],
    },
    output: {
      riseAlong: 0.625,
      riseAcross: -0.375,
      steepest: 0.728869,
      slope: 0.0417611,
      rises: -30.9638,
      words: "The floor rises 0.7 mm/m ahead and to the right.",
      flatness: 0.125,
      bump: { x: 0, y: 0, deviation: 0.0625 },
      hollow: { x: 1000, y: 0, deviation: -0.0625 },
      deviations: [0.0625, -0.0625, -0.0625, 0.0625],
      rating: "good" as const,
      ratingWords: "Good for layout: 0.7 mm/m and 0.1 mm from bump to hollow.",
      shims: null,
      fNumbers: { flatness: 28.8406, levelness: 20.2097, className: "moderately flat" },
    },
  },
];
