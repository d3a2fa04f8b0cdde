import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { type Change } from "@/lib/journal/change";
import { overlay } from "@/lib/journal/merge";
import { upgradeChange } from "@/lib/journal/upgrade";
import { orderCardQuery } from "@/lib/store/queries/orders";
import { wearerCardQuery } from "@/lib/store/queries/wearers";

/** A journal as the first version wrote it; never edited, so that its readers cannot forget it. */
const firstVersion = JSON.parse(
  readFileSync(new URL("./fixtures/journal-schema-1.json", import.meta.url), "utf8"),
) as Change[];

describe("V1 older changes", () => {
  it("are taken through every step in order", () => {
    const change = { ...firstVersion[0]!, schema: 1 };
    const seen: number[] = [];
    const step = (from: Change): Change => {
      seen.push(from.schema);
      return { ...from, writtenAt: `${from.writtenAt}+` };
    };
    const upgraded = upgradeChange(change, 3, [step, step]);
    expect(seen).toEqual([1, 2]);
    expect(upgraded.schema).toBe(3);
    expect(upgraded.writtenAt).toBe(`${change.writtenAt}++`);
    expect(() => upgradeChange(change, 3, [step])).toThrow("No step leads from schema 2");
  });

  it("V3 from a newer version are left as they are", () => {
    const newer = { ...firstVersion[0]!, schema: 99 };
    expect(upgradeChange(newer)).toBe(newer);
  });

  it("of the first version still show the figures and the money that were kept", () => {
    const rows = overlay(
      {},
      firstVersion.map((change) => upgradeChange(change)),
    );
    const wearer = wearerCardQuery.view(rows, { id: rows.wearers![0]!.id })!;
    expect(wearer.wearer.name).toBe("Marisol");
    expect(wearer.sets[0]!.figures).toEqual([{ key: "upperArmGirth", typed: "7 1/4", mm: 184.15 }]);
    const order = orderCardQuery.view(rows, { id: rows.orders![0]!.id })!;
    expect(order.sums).toMatchObject({ totalMinor: 9000, balanceMinor: 4500 });
    expect(order.receipts.map((receipt) => receipt.number)).toEqual(["7KQ4MX-0001"]);
  });
});
