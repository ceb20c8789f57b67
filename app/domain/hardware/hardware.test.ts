import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees } from "../units/angle";
import { inches, mm } from "../units/length";
import { boltShear, boltStrength, boltTightening } from "./bolt";
import { BOLT_GRADES, gradeStress } from "./bolt-grade";
import { bracketHole } from "./bracket-hole";
import { MPA_PER_KSI, NEWTON_METRES_PER_FOOT_POUND, NEWTONS_PER_MM_PER_KIP_INCH } from "./customary";
import { filletWeld, loadAngleFactor, requiredLeg, smallestLeg, weldThroat } from "./fillet-weld";
import { findThread, shankArea, stressArea, THREADS } from "./thread";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const thread = (name: string) => value(findThread(name));

describe("customary units", () => {
  it("are what their definitions make", () => {
    expect(MPA_PER_KSI).toBeCloseTo(6.894757, 6);
    expect(NEWTON_METRES_PER_FOOT_POUND).toBeCloseTo(1.355818, 6);
    expect(NEWTONS_PER_MM_PER_KIP_INCH).toBeCloseTo(175.1268, 4);
  });
});

describe("findThread", () => {
  it("does the example", () => {
    expect(thread("1/2-13 UNC")).toMatchObject({ name: "1/2-13", diameter: 12.7 });
    expect(thread("1/2-13").pitch).toBeCloseTo(1.953846, 6);
  });
  it.each([
    ['1/2"-13 UNC-2A', "1/2-13"],
    ["1/2 - 20 UNF", "1/2-20"],
    ["1⁄2–13", "1/2-13"],
    ["½-13", "1/2-13"],
    ["1-1/8-12", "1 1/8-12"],
    ["1-8", "1-8"],
    ["m12", "M12"],
    ["M12 x 1.75", "M12"],
    ["M10×1.5", "M10"],
  ])("reads %s", (text, name) => expect(thread(text).name).toBe(name));
  it.each(["", "1/2", "1/2-14", "M12x1.25", "M13", "half inch", "1/2-13-13", "M12x"])(
    "does not know %j",
    (text) => expect(fault(findThread(text))).toMatch(/not a thread known here/),
  );
  it("never throws, and finds every thread by its own name", () => {
    fc.assert(fc.property(fc.string(), (text) => typeof findThread(text).ok === "boolean"));
    for (const one of THREADS) expect(thread(one.name)).toBe(one);
    expect(new Set(THREADS.map((one) => one.name)).size).toBe(THREADS.length);
  });
});

describe("stressArea", () => {
  it("does the examples", () => {
    expect(stressArea(thread("1/2-13"))).toBeCloseTo(91.55, 2);
    expect(stressArea(thread("M12"))).toBeCloseTo(84.27, 2);
    expect(shankArea(thread("M12"))).toBeCloseTo(113.097, 3);
  });
  it("lies under the shank's and grows with the diameter within a series", () => {
    for (const series of ["UNC", "UNF", "metric coarse"]) {
      const areas = THREADS.filter((one) => one.series === series).map(stressArea);
      areas.slice(1).forEach((area, i) => {
        expect(area).toBeGreaterThan(areas[i] ?? Number.NaN);
      });
    }
    for (const one of THREADS) expect(stressArea(one)).toBeLessThan(shankArea(one));
  });
  it("is more for the fine thread of a diameter", () => {
    expect(stressArea(thread("3/4-16"))).toBeGreaterThan(stressArea(thread("3/4-10")));
  });
});

describe("gradeStress", () => {
  it("does the example, and falls where the standard has it fall", () => {
    const five = value(gradeStress("5", thread("1/2-13")));
    expect(five.proof).toBeCloseTo(586.05, 2);
    expect(five.tensile).toBeCloseTo(827.37, 2);
    const at = (grade: (typeof BOLT_GRADES)[number], name: string) =>
      value(gradeStress(grade, thread(name))).proof;
    expect(at("2", "3/4-10") / MPA_PER_KSI).toBeCloseTo(55, 9);
    expect(at("2", "7/8-9") / MPA_PER_KSI).toBeCloseTo(33, 9);
    expect(at("5", "1-8") / MPA_PER_KSI).toBeCloseTo(85, 9);
    expect(at("5", "1 1/8-7") / MPA_PER_KSI).toBeCloseTo(74, 9);
    expect([at("8.8", "M16"), at("8.8", "M18")]).toEqual([580, 600]);
  });
  it("does not mix inch and metric", () => {
    expect(fault(gradeStress("8", thread("M8")))).toMatch(/is metric/);
    expect(fault(gradeStress("8.8", thread("5/16-18")))).toMatch(/inch thread/);
  });
  it("knows every thread in every grade of its own system", () => {
    for (const one of THREADS)
      for (const grade of BOLT_GRADES)
        expect(gradeStress(grade, one).ok).toBe((one.series === "metric coarse") === grade.includes("."));
  });
});

describe("bolts", () => {
  it("do the examples", () => {
    const m12 = value(boltStrength(thread("M12"), "8.8"));
    expect([Math.round(m12.proofLoad), Math.round(m12.tensileLoad)]).toEqual([48_874, 67_413]);
    const half = value(boltTightening(thread("1/2-13"), "5"));
    expect(half.clamp).toBeCloseTo(40_239, 0);
    expect(half.torque).toBeCloseTo(102.21, 2);
    expect(half.torque / NEWTON_METRES_PER_FOOT_POUND).toBeCloseTo(75.4, 1);
    expect(half.overProof).toBe(false);
    expect(value(boltTightening(thread("1/2-13"), "5", { clampShare: 0.9 })).overProof).toBe(true);
    expect(value(boltShear(thread("1/2-13"), "8", { planes: 2, threadsInPlane: false }))).toBeCloseTo(
      157_213,
      0,
    );
  });
  it("clamp more with every share, and more scatter only widens it", () => {
    const share = fc.double({ min: 0.05, max: 1, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...THREADS), share, share, (one, a, b) => {
        fc.pre(b - a > 1e-6);
        const grade = one.series === "metric coarse" ? "10.9" : "8";
        const [low, high] = [a, b].map((clampShare) => value(boltTightening(one, grade, { clampShare })));
        expect(high?.clamp).toBeGreaterThan(low?.clamp ?? Number.NaN);
        expect(high?.torque).toBeGreaterThan(low?.torque ?? Number.NaN);
        const wide = value(boltTightening(one, grade, { clampShare: a, scatter: 0.5 }));
        expect(wide.clamp).toBe(low?.clamp);
        expect(wide.clampLow).toBeLessThan(low?.clampLow ?? Number.NaN);
      }),
    );
  });
  it("clamp more the thicker the bolt, within one range of a grade", () => {
    const unc = THREADS.filter((one) => one.series === "UNC").map(
      (one) => value(boltTightening(one, "8")).clamp,
    );
    unc.slice(1).forEach((clamp, i) => {
      expect(clamp).toBeGreaterThan(unc[i] ?? Number.NaN);
    });
  });
  it("shear twice as hard in two planes, and easier through the threads", () => {
    const one = thread("5/8-18");
    const shear = (planes: 1 | 2, threadsInPlane: boolean) =>
      value(boltShear(one, "8", { planes, threadsInPlane }));
    expect(shear(2, true)).toBeCloseTo(2 * shear(1, true), 9);
    expect(shear(1, true)).toBeLessThan(shear(1, false));
  });
  it("say what cannot be", () => {
    const one = thread("1/2-13");
    expect(fault(boltTightening(one, "5", { clampShare: 1.1 }))).toMatch(/proof load/);
    expect(fault(boltTightening(one, "5", { nutFactor: 0 }))).toMatch(/nut factor/);
    expect(fault(boltTightening(one, "5", { scatter: 1 }))).toMatch(/scatter/);
    expect(fault(boltTightening(one, "8.8"))).toMatch(/inch thread/);
    expect(fault(boltShear(one, "5", { planes: 1, threadsInPlane: true, shearShare: 0 }))).toMatch(
      /shear share/,
    );
    expect(fault(boltShear(one, "8.8", { planes: 1, threadsInPlane: true }))).toMatch(/inch thread/);
  });
});

describe("bracketHole", () => {
  const hole = {
    bolt: inches(0.75),
    hole: inches(0.8125),
    thickness: inches(1),
    edgeDistance: null,
    tensile: 58 * MPA_PER_KSI,
  };
  it("does the example", () => {
    expect(value(bracketHole(hole)).design).toBeCloseTo(348_296, 0);
  });
  it("tears out near an edge", () => {
    const near = value(bracketHole({ ...hole, edgeDistance: inches(1) }));
    expect(near.governs).toBe("tearOut");
    expect(near.nominal).toBe(near.tearOut);
    expect(value(bracketHole({ ...hole, edgeDistance: inches(4) })).governs).toBe("bearing");
  });
  it("says what cannot be", () => {
    expect(fault(bracketHole({ ...hole, hole: inches(0.7) }))).toMatch(/smaller than the bolt/);
    expect(fault(bracketHole({ ...hole, edgeDistance: inches(0.4) }))).toMatch(/reaches the edge/);
    expect(fault(bracketHole({ ...hole, thickness: mm(0) }))).toMatch(/more than nothing/);
  });
});

describe("fillet welds", () => {
  const weld = { leg: inches(0.75), length: inches(8), electrode: 70 * MPA_PER_KSI, angle: degrees(0) };
  it("do the examples", () => {
    expect(value(filletWeld(weld)).design).toBeCloseTo(594_474, -1);
    expect(weldThroat(mm(6))).toBeCloseTo(4.2426, 4);
    expect(value(loadAngleFactor(degrees(45)))).toBeCloseTo(1.297302, 6);
    expect(value(loadAngleFactor(degrees(90)))).toBe(1.5);
    const needed = { length: mm(100), electrode: 482.6, angle: degrees(0), method: "allowable" as const };
    expect(value(requiredLeg(53_400, needed))).toBeCloseTo(5.2161, 4);
    expect(value(smallestLeg(mm(6.35)))).toBe(3.175);
    expect(value(smallestLeg(mm(30)))).toBe(7.9375);
  });
  it("carry just the load that their leg was asked for", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1000, max: 100_000, noNaN: true }),
        fc.double({ min: 60, max: 400, noNaN: true }),
        fc.double({ min: 0, max: 90, noNaN: true }),
        fc.constantFrom("allowable" as const, "design" as const),
        (load, length, angle, method) => {
          const asked = { length: mm(length), electrode: 480, angle: degrees(angle), method };
          const leg = requiredLeg(load, asked);
          fc.pre(leg.ok);
          const { method: _, ...rest } = asked;
          expect(value(filletWeld({ ...rest, leg: value(leg) }))[method] / load).toBeCloseTo(1, 9);
        },
      ),
    );
  });
  it("count only a quarter of a short weld's length as leg", () => {
    const short = value(filletWeld({ ...weld, length: inches(2) }));
    expect(short.countedLeg).toBeCloseTo(inches(0.5), 9);
    expect(short.throat).toBeCloseTo(weldThroat(inches(0.75)), 9);
  });
  it("say what cannot be", () => {
    expect(fault(filletWeld({ ...weld, leg: mm(0) }))).toMatch(/more than nothing/);
    expect(fault(filletWeld({ ...weld, angle: degrees(91) }))).toMatch(/from 0°/);
    const needed = { length: mm(10), electrode: 482.6, angle: degrees(0), method: "design" as const };
    expect(fault(requiredLeg(53_400, needed))).toMatch(/too short/);
    expect(fault(requiredLeg(0, needed))).toMatch(/load/);
    expect(fault(requiredLeg(1, { ...needed, length: mm(0) }))).toMatch(/longer than nothing/);
    expect(fault(requiredLeg(1, { ...needed, angle: degrees(-1) }))).toMatch(/from 0°/);
    expect(fault(smallestLeg(mm(0)))).toMatch(/thickness/);
  });
});
