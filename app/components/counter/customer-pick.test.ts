import { describe, expect, it } from "vitest";
import { matchCustomers } from "./customer-pick";

const customers = ["Abel Quist", "Quentin Abel", "Rosa Lind"].map((name, index) => ({
  id: index + 1,
  name,
  phone: `(555) 010-${index}42`,
  email: "",
}));
const found = (typed: string) => matchCustomers(customers, typed).map((customer) => customer.name);

describe("matchCustomers", () => {
  it("finds by any part of the name, those that begin with it first", () => {
    expect(found("ABEL")).toEqual(["Abel Quist", "Quentin Abel"]);
    expect(found("qu")).toEqual(["Quentin Abel", "Abel Quist"]);
    expect(found("nobody")).toEqual([]);
  });

  it("finds by the digits of the number, however they are written", () => {
    expect(found("0102 42")).toEqual(["Rosa Lind"]);
    expect(found("55")).toEqual([]);
  });

  it("offers the first few before anything is typed", () => {
    expect(found(" ")).toEqual(["Abel Quist", "Quentin Abel", "Rosa Lind"]);
  });
});
