/** Worked examples of steering, as its page shows them. */
export const STEERING_EXAMPLES = [
  {
    title: "Drag link, axle moved 2 in ahead",
    input: {
      what: "drag-link" as const,
      box: {
        x: 1778,
        y: 304.8,
        z: 762,
      },
      axle: {
        x: 1092.2,
        y: 457.2,
        z: 609.6,
      },
      moved: 50.8,
    },
    output: {
      what: "drag-link" as const,
      length: 718.869362,
      planAngle: 167.471192,
      sideAngle: -12.2395583,
      change: -48.2901201,
    },
  },
  {
    title: "Bump steer: a 30 in link to a 6 in arm, the axle swinging on 24 in",
    input: {
      what: "bump-steer" as const,
      box: {
        x: 762,
        y: 152.4,
        z: 508,
      },
      arm: {
        x: 0,
        y: 152.4,
        z: 508,
      },
      kingpin: {
        x: 0,
        y: 0,
        z: 508,
      },
      path: [
        {
          rise: -76.2,
          ahead: 4.78125029,
        },
        {
          rise: 0,
          ahead: 0,
        },
        {
          rise: 76.2,
          ahead: 4.78125029,
        },
      ],
    },
    output: {
      what: "bump-steer" as const,
      places: [
        {
          rise: -76.2,
          ahead: 4.78125029,
          turn: 0.36155131,
        },
        {
          rise: 0,
          ahead: 0,
          turn: -1.27222187e-14,
        },
        {
          rise: 76.2,
          ahead: 4.78125029,
          turn: 0.36155131,
        },
      ],
      perInch: -0.120517103,
    },
  },
  {
    title: "Inner wheel 28°, wheelbase 2.6 m, pivots 1.5 m",
    input: {
      what: "ackermann" as const,
      pivots: 1500,
      wheelbase: 2600,
      inner: 28,
    },
    output: {
      what: "ackermann" as const,
      inner: 28,
      outer: 22.1410556,
      davis: 16.0908163,
    },
  },
  {
    title: "Four-bar linkage 100, 40, 120, 80 at 40°",
    input: {
      what: "four-bar" as const,
      ground: 100,
      crank: 40,
      coupler: 120,
      rocker: 80,
      angle: 40,
    },
    output: {
      what: "four-bar" as const,
      open: {
        coupler: 20.2978828,
        rocker: 57.3248801,
      },
      crossed: {
        coupler: -60.9779668,
        rocker: -98.0049641,
      },
    },
  },
];
