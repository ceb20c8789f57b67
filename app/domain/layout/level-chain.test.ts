import { describe, expect, it } from "vitest";
import { carrierOf, levelGround, type Round } from "./level-chain";

const round = (id: number, over: Partial<Round> = {}): Round => ({
  id,
  bayId: 1,
  isTrue: true,
  isVoid: false,
  carriesId: null,
  carryOffMm: null,
  ...over,
});
const ids = (set: Set<number>) => [...set].sort();

describe("levelGround", () => {
  it("has nothing before the first round", () => expect(levelGround([]).state).toBe("none"));
  it("lets drops of a true level stand", () => {
    const ground = levelGround([round(1)]);
    expect([ground.state, ids(ground.standing), ids(ground.waiting)]).toEqual(["true", [1], []]);
  });
  it("lets them wait once the level is void", () => {
    const ground = levelGround([round(1, { isVoid: true })]);
    expect([ground.state, ids(ground.standing), ids(ground.waiting)]).toEqual(["void", [], [1]]);
  });
  it("wants one dropped again after a new level", () => {
    const ground = levelGround([round(1, { isVoid: true }), round(2)]);
    expect([ids(ground.standing), ids(ground.waiting)]).toEqual([[2], [1]]);
  });
  it("carries them when it fell within tolerance", () => {
    const ground = levelGround([round(1, { isVoid: true }), round(2, { carriesId: 1, carryOffMm: 1 })]);
    expect([ids(ground.standing), ids(ground.waiting)]).toEqual([[1, 2], []]);
  });
  it("lets them go when it did not", () => {
    const ground = levelGround([round(1, { isVoid: true }), round(2, { carryOffMm: 9 })]);
    expect([ids(ground.standing), ids(ground.waiting)]).toEqual([[2], []]);
  });
  it("follows the chain over several rounds", () => {
    const ground = levelGround([
      round(1, { isVoid: true }),
      round(2, { isVoid: true, carriesId: 1, carryOffMm: 1 }),
      round(3),
    ]);
    expect([ids(ground.standing), ids(ground.waiting)]).toEqual([[3], [1, 2]]);
  });
  it("leaves it open while levels come and go without a drop", () => {
    const rounds = [round(1, { isVoid: true }), round(2, { isVoid: true }), round(3)];
    expect(ids(levelGround(rounds).waiting)).toEqual([1, 2]);
    expect(carrierOf(rounds, rounds[2]!, 1)?.id).toBe(1);
  });
  it("carries from the newest round that has them", () => {
    const rounds = [
      round(1, { isVoid: true }),
      round(2, { isVoid: true, carriesId: 1, carryOffMm: 1 }),
      round(3),
    ];
    expect(carrierOf(rounds, rounds[2]!, 1)?.id).toBe(2);
  });
  it("lets drops wait while a new round is not true yet", () => {
    const ground = levelGround([round(1, { isVoid: true }), round(2, { isTrue: false })]);
    expect([ground.state, ids(ground.waiting)]).toEqual(["not-true", [1]]);
  });
  it("carries nothing from another bay", () => {
    const ground = levelGround([round(1, { isVoid: true }), round(2, { bayId: 2 })]);
    expect([ids(ground.standing), ids(ground.waiting)]).toEqual([[2], []]);
  });
});
