import { describe, expect, it } from "vitest";
import { firstSteps } from "@/lib/orders/first-steps";
import { readUnfinished } from "@/lib/orders/unfinished";
import { newId } from "@/lib/journal/change";
import { fullSet } from "@/lib/figures/body-measures";
import { begin } from "@/lib/measuring/taking";
import { type Client, type MeasurementSet, type Sleeve } from "@/lib/records/types";
import { todayOn, type todayQuery } from "@/lib/store/queries/today";
import { client, head, order } from "./support";

describe("the first path", () => {
  const none = { client: null, set: null, sleeve: null };
  const states = (anyOrder: boolean, newest: Parameters<typeof firstSteps>[0]["newest"]) =>
    firstSteps({ anyOrder, newest }).map(({ state }) => state);

  it("picks out the next step", () => {
    expect(states(false, none)).toEqual(["next", "later", "later", "later"]);
    expect(states(false, { ...none, client })).toEqual(["done", "next", "later", "later"]);
    const set = { wearerId: "ife" } as MeasurementSet;
    expect(states(false, { client, set, sleeve: {} as Sleeve })).toEqual(["done", "done", "done", "next"]);
    expect(states(true, { client, set, sleeve: {} as Sleeve })).toEqual(["done", "done", "done", "done"]);
  });

  it("passes over what was done out of turn", () => {
    expect(states(false, { ...none, sleeve: {} as Sleeve })).toEqual(["next", "later", "done", "later"]);
  });

  it("leads on with whom it is about", () => {
    const steps = firstSteps({ anyOrder: false, newest: { ...none, client: client as Client } });
    expect(steps.map(({ href }) => href)).toEqual([
      "/clients/new",
      "/measure?client=c",
      "/sleeves/draft",
      "/orders/new?client=c",
    ]);
  });
});

describe("what was begun and not kept", () => {
  const id = newId();

  it.each([
    [`order:new:${id}`, "new-order", `/orders/new?client=${id}`],
    [`order:change:${id}`, "change-order", `/orders/change?id=${id}`],
    [`order:money:${id}`, "money", `/orders/card?id=${id}&money=take`],
    [`order:giving-back:${id}`, "giving-back", `/orders/card?id=${id}&money=give-back`],
  ])("%s", (key, kind, href) => {
    expect(readUnfinished(key, {})).toMatchObject({ kind, href });
  });

  it("counts the figures of a half-taken set", () => {
    const taking = begin({
      setId: newId(),
      wearerId: id,
      keys: fullSet.measures.slice(0, 2),
      unit: "in",
      now: "2026-03-01T09:00:00.000Z",
      today: "2026-03-01",
      takenBy: "",
    });
    const read = readUnfinished(`measure:${id}`, taking);
    expect(read).toMatchObject({ kind: "set", wearerId: id, taken: 0, of: 2, href: `/measure?wearer=${id}` });
    const corrects = newId();
    expect(
      readUnfinished(`measure:${id}:corrects:${corrects}`, { ...taking, correctsId: corrects })?.href,
    ).toBe(`/measure?wearer=${id}&corrects=${corrects}`);
  });

  it("passes over what it does not know", () => {
    expect(readUnfinished("client:new", {})).toBeNull();
    expect(readUnfinished("order:new:nobody", {})).toBeNull();
    expect(readUnfinished(`measure:${id}`, { shape: 0 })).toBeNull();
  });
});

describe("today, from rows that were fetched on another day", () => {
  const rows = {
    clients: [client],
    orders: [
      { ...order, id: "1", dueOn: "2026-03-20" },
      { ...order, id: "2", dueOn: "2026-03-27" },
      { ...order, id: "3", dueOn: null },
    ],
    garments: [
      {
        ...head,
        id: "g",
        orderId: "1",
        wearerId: null,
        kind: "Dress",
        setId: null,
        sleeveId: null,
        fittingOn: "2026-03-18",
        note: "",
        position: 0,
      },
    ],
  } as unknown as Parameters<typeof todayQuery.view>[0];
  const split = (on: string) => {
    const { late, due, fittings, laterCount } = todayOn(on).view(rows, {});
    return [late, due, fittings]
      .map((items) => items.map((item) => item.order.id))
      .concat([[String(laterCount)]]);
  };

  it("is split by the day that it is looked at", () => {
    expect(split("2026-03-12")).toEqual([[], [], ["1"], ["3"]]);
    expect(split("2026-03-20")).toEqual([[], ["1", "2"], ["1"], ["1"]]);
    expect(split("2026-03-21")).toEqual([["1"], ["2"], ["1"], ["1"]]);
    expect(split("2026-04-01")).toEqual([["1", "2"], [], [], ["1"]]);
  });
});
