/** Worked examples of level, as its page shows them. */
export const LEVEL_EXAMPLES = [
  {
    title: "Four stands by water level, two points to be dropped",
    input: {
      stands: [
        { id: "left front", x: 1778, y: 381, height: 611.1875 },
        { id: "right front", x: 1778, y: -381, height: 617.5375 },
        { id: "left rear", x: -1016, y: 381, height: 604.8375 },
        { id: "right rear", x: -1016, y: -381, height: 614.3625 },
      ],
      points: [
        { id: "opening lip", height: 762 },
        { id: "hub", height: -150 },
      ],
    },
    output: {
      noseHigh: 0.0976632,
      rightHigh: 0.596809,
      steepest: 0.604746,
      uncertainty: { noseHigh: 0.0164053, rightHigh: 0.0601465 },
      allowed: 0.1,
      isTrue: false,
      headline: "Right side high 0.60°, nose high 0.10°.",
      twist: 0.79375,
      twistDegrees: null,
      notes: ["One height more than a plane needs: a wrong one or twist shows, but not which stand."],
      shifts: [
        { id: "opening lip", ahead: -1.29879, left: 7.93706 },
        { id: "hub", ahead: 0.255668, left: -1.56241 },
      ],
      plan: {
        moves: [
          { id: "left front", raise: 7.9375 },
          { id: "right front", raise: 0 },
          { id: "left rear", raise: 12.7 },
          { id: "right rear", raise: 4.7625 },
        ],
        words: ["Raise left front 7.9 mm.", "Raise left rear 12.7 mm.", "Raise right rear 4.8 mm."],
        after: { noseHigh: 0, rightHigh: 0, twist: 0.79375 },
        isTrue: true,
      },
    },
  },
  {
    title: "The slope allowed from 1 mm at the highest point; gauge and heights together",
    input: {
      stands: [
        { id: "left front", x: 1778, y: 381, height: 611.1875 },
        { id: "right front", x: 1778, y: -381, height: 617.5375 },
        { id: "left rear", x: -1016, y: 381, height: 604.8375 },
      ],
      gauge: {
        leftRail: { first: 0.3, turned: 0.1 },
        rightRail: { first: 0.3, turned: 0.1 },
        frontCross: { first: 0.8, turned: -0.4 },
        rearCross: { first: 0.8, turned: -0.4 },
      },
      points: [{ id: "opening lip", height: 800 }],
      allowedError: 1,
      mode: "either" as const,
      shim: 1,
    },
    output: {
      noseHigh: 0.108432,
      rightHigh: 0.59657,
      steepest: 0.606343,
      uncertainty: { noseHigh: 0.0122556, rightHigh: 0.0142303 },
      allowed: 0.0716197,
      isTrue: false,
      headline: "Right side high 0.60°, nose high 0.11°.",
      twist: 0,
      twistDegrees: 0,
      notes: [
        "1.0 mm at opening lip, 800.0 mm from the datum, allows 0.072°.",
        "Three heights always fit a plane: nothing checks them, and twist does not show. A fourth would.",
        "Gauge and heights agree.",
      ],
      shifts: [{ id: "opening lip", ahead: -1.51391, left: 8.32953 }],
      plan: {
        moves: [
          { id: "left front", raise: 0 },
          { id: "right front", raise: -6 },
          { id: "left rear", raise: 6 },
        ],
        words: ["Lower right front 6.0 mm.", "Raise left rear 6.0 mm."],
        after: { noseHigh: 0.00717735, rightHigh: 0.026317, twist: 0 },
        isTrue: true,
      },
    },
  },
];
