/** Worked examples of hardware, as its page shows them. */
export const HARDWARE_EXAMPLES = [
  {
    title: "1/2-13 grade 5, dry",
    input: {
      what: "bolt" as const,
      thread: "1/2-13",
      grade: "5" as const,
    },
    output: {
      what: "bolt" as const,
      stressArea: 91.5474456,
      proofMegapascals: 586.05437,
      tensileMegapascals: 827.370875,
      proofNewtons: 53651.7805,
      tensileNewtons: 75743.6902,
      clampNewtons: 40238.8354,
      clampLowNewtons: 28167.1848,
      clampHighNewtons: 52310.486,
      torqueNewtonMetres: 102.206642,
      overProof: false,
    },
  },
  {
    title: "M12 class 10.9 in double shear, threads clear of the planes",
    input: {
      what: "boltShear" as const,
      thread: "M12",
      grade: "10.9" as const,
      planes: 2 as const,
      threadsInPlane: false,
    },
    output: {
      what: "boltShear" as const,
      shearNewtons: 141145.475,
    },
  },
  {
    title: "9/16 in bolt in a 1/4 in tab, 1 in to the edge",
    input: {
      what: "bracketHole" as const,
      bolt: 14.2875,
      hole: 15.0813,
      thickness: 6.35,
      edgeDistance: 25.4,
      tensileMegapascals: 400,
    },
    output: {
      what: "bracketHole" as const,
      bearingNewtons: 87096.6,
      tearOutNewtons: 54435.2988,
      governs: "tearOut" as const,
      allowableNewtons: 27217.6494,
      designNewtons: 40826.4741,
    },
  },
  {
    title: "Leg for 20 kN on 75 mm of weld, 6.35 mm plate",
    input: {
      what: "weldLeg" as const,
      loadNewtons: 20000,
      method: "allowable" as const,
      length: 75,
      thinnerPlate: 6.35,
    },
    output: {
      what: "weldLeg" as const,
      leg: 2.60462654,
      throat: 1.84174909,
      smallestLeg: 3.175,
      layLeg: 3.175,
    },
  },
];
