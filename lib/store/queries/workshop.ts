import { type Workshop } from "@/lib/records/types";
import { liveRowsOf, type Query } from "../query";

/** The workshop itself, or null before the first start. */
export const workshopQuery: Query<Record<string, never>, Workshop | null> = {
  name: "workshop",
  need: async (source) => ({ workshops: await source.workshop() }),
  view: (rows) => liveRowsOf(rows, "workshops")[0] ?? null,
};
