import { describe, expect, it } from "vitest";
import {
  askedWearers,
  emptyManyForm,
  MOST_WEARERS,
  readMany,
  restoredManyForm,
  styleOnly,
  withoutWearers,
  withStyle,
  withWearers,
} from "@/lib/many/many-form";
import { withStyleText } from "@/lib/sleeves/style-form";

const empty = emptyManyForm("in", 8);

describe("what is chosen for many", () => {
  it("has each wearer once, and no more than a phone has room for", () => {
    const form = withWearers(withWearers(empty, ["a", "b"]), ["b", "c"]);
    expect(form.wearerIds).toEqual(["a", "b", "c"]);
    expect(withoutWearers(form, ["b", "x"]).wearerIds).toEqual(["a", "c"]);
    const lots = Array.from({ length: MOST_WEARERS + 5 }, (_, i) => String(i));
    expect(withWearers(form, lots).wearerIds).toHaveLength(MOST_WEARERS);
  });

  it("reads them from the address, and passes over what is no id", () => {
    const id = "01890002-0000-7000-8000-000000000003";
    expect(askedWearers(`${id},nonsense,,${id}`)).toEqual([id]);
    expect(askedWearers(null)).toEqual([]);
  });

  it("takes a style's figures from its own fields and gives them back", () => {
    const typed = withStyleText({ ...styleOnly(empty), style: "puff" as const }, "headOpen", "2");
    expect(withStyle(empty, typed)).toMatchObject({ style: "puff", styleTyped: { puff: { headOpen: "2" } } });
  });

  it("comes back in the workshop's unit, whatever it was typed in", () => {
    const draft = {
      ...withStyle(empty, withStyleText({ ...styleOnly(empty), style: "statement" }, "headOpen", "2")),
      clothWidth: "45",
      allowance: "1/4",
    };
    const now = restoredManyForm(draft, "cm", 8);
    expect(now).toMatchObject({ unit: "cm", clothWidth: "114.3", allowance: "0.6" });
    expect(now.styleTyped.statement).toEqual({ headOpen: "5.1" });
    expect(restoredManyForm(draft, "in", 8)).toEqual(draft);
    expect(restoredManyForm({}, "in", 8)).toEqual(empty);
  });

  it("reads what is typed, and says what to type instead", () => {
    const typed = { ...empty, allowance: "1/4", clothWidth: "45", shrinkage: "5 %" };
    expect(readMany(typed)).toMatchObject({ allowance: 6.35, clothWidth: 1143, shrinks: 0.05, errors: {} });
    expect(readMany(empty)).toMatchObject({ allowance: 6.35, clothWidth: null, shrinks: 0, errors: {} });
    const { errors } = readMany({ ...empty, allowance: "", clothWidth: "2", shrinkage: "lots" });
    expect(errors.allowance).toMatch(/Type a length/u);
    expect(errors.clothWidth).toMatch(/shorter than/u);
    expect(errors.shrinkage).toMatch(/Type a number, such as 5/u);
    expect(readMany({ ...empty, shrinkage: "95" }).errors.shrinkage).toMatch(/type it again/u);
  });
});
