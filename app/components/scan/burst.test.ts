import { describe, expect, it } from "vitest";
import { type Burst, NO_BURST, takeKey } from "./burst";

function type(keys: string[], gap: number): string | null {
  let burst: Burst = NO_BURST;
  let text: string | null = null;
  keys.forEach((key, index) => {
    ({ burst, text } = takeKey(burst, key, 1000 + index * gap));
  });
  return text;
}

describe("takeKey", () => {
  it("finds what a scanner types", () => {
    expect(type([..."M3XF", "Enter"], 8)).toBe("M3XF");
    expect(type([..."http://10.0.0.4:3000/t/M3XF", "Enter"], 12)).toBe("http://10.0.0.4:3000/t/M3XF");
  });

  it("lets the shift key of a capital pass", () => {
    expect(type(["Shift", "M", "3", "Shift", "X", "Shift", "F", "Enter"], 8)).toBe("M3XF");
  });

  it("leaves a person's typing alone", () => {
    expect(type([..."M3XF", "Enter"], 140)).toBeNull();
  });

  it("is not begun by a bare Enter, a short run or another key", () => {
    expect(type(["Enter"], 8)).toBeNull();
    expect(type([..."M3", "Enter"], 8)).toBeNull();
    expect(type(["M", "3", "Tab", "X", "F", "Enter"], 8)).toBeNull();
  });

  it("starts again after a pause", () => {
    let { burst } = takeKey(NO_BURST, "q", 0);
    let text: string | null = null;
    [..."M3XF", "Enter"].forEach((key, index) => {
      ({ burst, text } = takeKey(burst, key, 5000 + index * 8));
    });
    expect(text).toBe("M3XF");
  });
});
