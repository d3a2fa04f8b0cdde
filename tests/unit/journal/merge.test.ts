import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type RowChange } from "@/lib/journal/change";
import { type AnyRow, mergeRow, overlay, type Rows } from "@/lib/journal/merge";
import { changesOf, WORKSHOP } from "@/tests/support/changes";

const stamp = fc.integer({ min: 0, max: 6 }).map((n) => `00000000000${n}-0000-d`);
const rowChange: fc.Arbitrary<RowChange> = fc.record({
  table: fc.constant("clients" as const),
  id: fc.constant("one"),
  makes: fc.boolean(),
  fields: fc.dictionary(
    fc.constantFrom("name", "note", "phone"),
    fc.record({
      value: fc.oneof(fc.constant(null), fc.string({ maxLength: 3 })),
      stamp,
      base: fc.constant(null),
    }),
  ),
});
const mergeAll = (changes: readonly RowChange[]): AnyRow | undefined =>
  changes.reduce<AnyRow | undefined>((row, change) => mergeRow(row, change, WORKSHOP), undefined);

describe("P2 merging", () => {
  it("is commutative: any order gives the same row", () => {
    fc.assert(
      fc.property(
        fc.array(rowChange, { minLength: 1, maxLength: 6 }),
        fc.infiniteStream(fc.nat()),
        (changes, luck) => {
          const shuffled = changes
            .map((change) => ({ change, at: luck.next().value as number }))
            .sort((a, b) => a.at - b.at)
            .map(({ change }) => change);
          expect(mergeAll(shuffled)).toEqual(mergeAll(changes));
        },
      ),
    );
  });

  it("is idempotent: a change applied again changes nothing, and gives back the very row", () => {
    fc.assert(
      fc.property(fc.array(rowChange, { minLength: 1, maxLength: 6 }), (changes) => {
        const row = mergeAll(changes);
        for (const change of changes) expect(mergeRow(row, change, WORKSHOP)).toBe(row);
      }),
    );
  });

  it("keeps the later stamp's value, field by field", () => {
    const early: RowChange = {
      table: "clients",
      id: "one",
      makes: true,
      fields: {
        name: { value: "Ada", stamp: "1", base: null },
        note: { value: "tall", stamp: "3", base: null },
      },
    };
    const late: RowChange = {
      table: "clients",
      id: "one",
      makes: false,
      fields: {
        name: { value: "Ida", stamp: "2", base: "1" },
        note: { value: "short", stamp: "2", base: null },
      },
    };
    expect(mergeAll([early, late])).toMatchObject({ name: "Ida", note: "tall" });
  });
});

describe("overlay", () => {
  const byId = (rows: Rows) =>
    Object.fromEntries(
      Object.entries(rows).map(([table, held]) => [
        table,
        new Map((held as AnyRow[]).map((row) => [row.id, row])),
      ]),
    );

  it("L2 replaying gives the same rows, wherever the database had come to", () => {
    fc.assert(
      fc.property(changesOf({ max: 12 }), fc.nat(), fc.nat(), (changes, a, b) => {
        const whole = overlay({}, changes);
        const upTo = a % (changes.length + 1);
        // The database has the first `upTo`; laid over it come all, or only those from `from` on.
        const from = Math.min(b % (changes.length + 1), upTo);
        const partly = overlay(overlay({}, changes.slice(0, upTo)), changes.slice(from));
        expect(byId(partly)).toEqual(byId(whole));
      }),
    );
  });

  it("leaves out a row that is only edited and not among the rows", () => {
    const edited = overlay({ clients: [] }, [
      {
        number: 9,
        device: "d",
        workshopId: WORKSHOP,
        schema: 1,
        writtenAt: "",
        rows: [
          {
            table: "clients",
            id: "gone",
            makes: false,
            fields: { name: { value: "x", stamp: "1", base: null } },
          },
        ],
      },
    ]);
    expect(edited.clients).toEqual([]);
  });
});
