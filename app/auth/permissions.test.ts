import { describe, expect, it } from "vitest";
import { ACTOR_ROLES } from "../domain/people/roles";
import { may, PERMISSIONS } from "./permissions";

describe("permissions", () => {
  it("give the owner everything", () => {
    expect(PERMISSIONS.every((permission) => may("owner", permission))).toBe(true);
  });
  it("let only foreman and owner approve a mounting, move vehicles and assign people", () => {
    for (const permission of ["options:approve", "floor:move", "crew:assign", "devices:pair"] as const)
      expect(ACTOR_ROLES.filter((role) => may(role, permission))).toEqual(["owner", "foreman"]);
  });
  it("let a display see the board and the wall, and nothing else", () => {
    expect(PERMISSIONS.filter((permission) => may("display", permission))).toEqual(["board:see", "wall:see"]);
  });
  it("keep customers from technicians", () => {
    expect(may("tech", "counter:see")).toBe(false);
  });
});
