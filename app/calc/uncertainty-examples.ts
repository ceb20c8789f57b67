/** Worked examples of uncertainty, as its page shows them. */
export const UNCERTAINTY_EXAMPLES = [
  {
    title: "Hole back by one half: a tape, two bobs and a spring measured on the bench",
    input: {
      model: "sum" as const,
      inputs: [
        {
          name: "the hole's station",
          value: 1816.1,
          uncertainty: 0.8,
          sensitivity: 1,
        },
        {
          name: "the half",
          value: 660.4,
          halfWidth: {
            value: 1.5875,
            spread: "rectangular" as const,
          },
          sensitivity: -1,
        },
        {
          name: "the bob",
          value: 0,
          uncertainty: 0.4,
        },
      ],
    },
    output: {
      value: 1155.7,
      uncertainty: 1.28064518,
      freedom: null,
      coverage: 0.95,
      coverageFactor: 1.95996398,
      expanded: 2.51001843,
      contributions: [
        {
          name: "the half",
          moves: -0.916543552,
          share: 0.512210613,
        },
        {
          name: "the hole's station",
          moves: 0.8,
          share: 0.390231509,
        },
        {
          name: "the bob",
          moves: 0.4,
          share: 0.0975578774,
        },
      ],
      words: "Mostly the half (51 %), then the hole's station (39 %).",
    },
  },
  {
    title: "Impedance U/I from five readings of each, taken together (JCGM 100, H.2)",
    input: {
      model: "product" as const,
      inputs: [
        {
          name: "voltage",
          readings: [5.007, 4.994, 5.005, 4.99, 4.999],
          power: 1,
        },
        {
          name: "current",
          readings: [0.019663, 0.019639, 0.01964, 0.019685, 0.019678],
          power: -1,
        },
      ],
      readTogether: true,
    },
    output: {
      value: 254.259702,
      uncertainty: 0.236336111,
      freedom: 4,
      coverage: 0.95,
      coverageFactor: 2.77644511,
      expanded: 0.656174,
      contributions: [
        {
          name: "voltage",
          moves: 0.163234897,
          share: 0.639794262,
        },
        {
          name: "current",
          moves: -0.122480839,
          share: 0.360205738,
        },
      ],
      words: "Mostly voltage (64 %), then current (36 %).",
    },
  },
  {
    title: "Wheelbase from two drops by certified tapes, with the factor 2 that the shop agreed on",
    input: {
      model: "sum" as const,
      inputs: [
        {
          name: "the front drop",
          value: 3352.8,
          expanded: {
            value: 1.2,
            coverageFactor: 2,
          },
        },
        {
          name: "the rear drop",
          value: 25.4,
          expanded: {
            value: 1.2,
            coverageFactor: 2,
          },
          sensitivity: -1,
        },
      ],
      correlations: [
        {
          a: "the front drop",
          b: "the rear drop",
          r: 0.5,
        },
      ],
      coverageFactor: 2,
    },
    output: {
      value: 3327.4,
      uncertainty: 0.6,
      freedom: null,
      coverage: 0.954499736,
      coverageFactor: 2,
      expanded: 1.2,
      contributions: [
        {
          name: "the front drop",
          moves: 0.6,
          share: 0.5,
        },
        {
          name: "the rear drop",
          moves: -0.6,
          share: 0.5,
        },
      ],
      words: "The most comes from the front drop (50 %), then the rear drop (50 %).",
    },
  },
];
