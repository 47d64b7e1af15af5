import { describe, expect, it } from "vitest";
import {
  type Budget,
  isList,
  LimitReached,
  startBudget,
  type Undecided,
  unlimited,
  withinBudget,
} from "../../src/outcomes/budget.js";

/** A clock that moves a fixed number of milliseconds at each look. */
function clock(step: number): () => number {
  let time = 0;
  return () => {
    time += step;
    return time;
  };
}

/** Spends until a limit is reached. */
function exhaust(budget: Budget, calls = 10_000): Undecided {
  const outcome = withinBudget(() => {
    for (let k = 0; k < calls; k++) budget.spend(() => `step ${k}`);
    return "done" as const;
  });
  if (outcome === "done") throw new Error("expected a limit");
  return outcome;
}

describe("a budget", () => {
  it("look at the clock at once for a call that stands for much work, and rarely for others", () => {
    let time = 0;
    const looks = (work: number | undefined): number => {
      time = 0;
      const budget = startBudget({ now: () => time++ });
      const before = time;
      for (let k = 0; k < 16; k++) budget.spend(() => "counting", work);
      return time - before;
    };
    expect([looks(8), looks(4), looks(1), looks(undefined)]).toEqual([16, 8, 2, 2]);
  });

  it("ends a computation when its seconds are over, and says where it was", () => {
    const outcome = exhaust(startBudget({ seconds: 1, now: clock(300) }));
    expect(outcome).toMatchObject({ kind: "undecided", limit: "seconds" });
    expect(outcome.reason).toMatch(/^after 1\.\d s, step \d+$/);
  });

  it("ends a computation when too many bytes are in use", () => {
    let bytes = 0;
    const bytesInUse = (): number => {
      bytes += 2 ** 20;
      return bytes;
    };
    const outcome = exhaust(startBudget({ bytes: 3 * 2 ** 20, bytesInUse, now: clock(150) }));
    expect(outcome).toMatchObject({ limit: "bytes" });
    expect(outcome.reason).toMatch(/^with 4 MiB in use, step \d+$/);
  });

  it("does not look at bytes when it cannot know them", () => {
    const budget = startBudget({ bytes: 1, now: clock(150) });
    for (let k = 0; k < 1000; k++) budget.spend(() => "");
    expect(budget.elapsed()).toBeGreaterThan(0);
  });

  it("ends a computation that was cancelled", () => {
    let asked = false;
    const budget = startBudget({ cancelled: () => asked });
    for (let k = 0; k < 1000; k++) budget.spend(() => "");
    asked = true;
    expect(exhaust(budget)).toMatchObject({ limit: "cancelled" });
  });

  it("reports progress, but not at every step, and does not name a stage nobody wants", () => {
    const stages: string[] = [];
    const budget = startBudget({ progress: (stage) => stages.push(stage), now: clock(60) });
    let named = 0;
    for (let k = 0; k < 8 * 20; k++) {
      budget.spend(() => {
        named++;
        return `step ${k}`;
      });
    }
    expect(stages).toHaveLength(10);
    expect(stages[0]).toMatch(/^step \d+$/);
    expect(named).toBe(10);
  });

  it("without limits never ends anything", () => {
    const budget = unlimited();
    for (let k = 0; k < 100_000; k++) budget.spend(() => "never asked");
    expect(budget.elapsed()).toBeGreaterThanOrEqual(0);
  });
});

describe("withinBudget", () => {
  it("hands values through and turns only reached limits into values", () => {
    expect(withinBudget(() => 5)).toBe(5);
    const undecided: Undecided = { kind: "undecided", limit: "size", reason: "too large" };
    const reached = withinBudget(() => {
      throw new LimitReached(undecided);
    });
    expect(reached).toBe(undecided);
    expect(() =>
      withinBudget(() => {
        throw new TypeError("another");
      }),
    ).toThrow("another");
  });

  it("lists are told from limits", () => {
    expect(isList([1])).toBe(true);
    expect(isList({ kind: "undecided", limit: "size", reason: "" })).toBe(false);
  });
});
