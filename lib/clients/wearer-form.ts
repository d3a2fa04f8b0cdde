import { z } from "zod";
import { westernDigits } from "@/lib/lengths/western-digits";
import { type IsoDate, monthsBetween, readDay } from "@/lib/people/iso-date";
import { type Wearer, type WearerFields } from "@/lib/records/types";

/** How the age is set down: by birth, as told on a day, or not asked of someone grown up. */
export type AgeKnown = "born" | "told" | "grown";

/** What the form holds, as typed. */
export interface WearerValues {
  name: string;
  known: AgeKnown;
  /** "1" to "12", or "" where the month is not known. */
  month: string;
  year: string;
  age: string;
  on: string;
  note: string;
}

export interface Problem<Field extends string> {
  field: Field;
  say: string;
}

/** Longer names do not fit a card; nobody has lived longer than 122 years. */
export const NAME_AT_MOST = 120;
const OLDEST = 122;

export const monthNames = [
  ..."January February March April May June July August September October November December".split(" "),
] as const;

export const emptyWearer = (today: IsoDate): WearerValues => ({
  name: "",
  known: "born",
  month: "",
  year: "",
  age: "",
  on: today,
  note: "",
});

/** True where nothing at all was typed. */
export function isBlankWearer({ name, month, year, age, note }: WearerValues): boolean {
  return [name, month, year, age, note].every((text) => text.trim() === "");
}

const digits = (text: string): string => westernDigits(text).trim();
const isDay = (text: string): boolean => {
  try {
    readDay(text);
    return true;
  } catch {
    return false;
  }
};

function birthProblems({ month, year }: WearerValues, today: IsoDate): Problem<"month" | "year">[] {
  const now = readDay(today);
  const typed = digits(year);
  if (typed === "")
    return [{ field: "year", say: "Type the year of birth, or choose another way to set down the age." }];
  if (!/^\d{4}$/u.test(typed))
    return [{ field: "year", say: "Type the year with all four figures, such as 2019." }];
  const born = Number(typed);
  if (born > now.year)
    return [
      { field: "year", say: `${born} is still to come. Type the year of birth, at the latest ${now.year}.` },
    ];
  if (now.year - born > OLDEST)
    return [
      {
        field: "year",
        say: `Born in ${born} would be ${now.year - born} years old. Type the year of birth again.`,
      },
    ];
  if (born === now.year && Number(month) > now.month)
    return [
      {
        field: "month",
        say: `${monthNames[Number(month) - 1]} ${born} is still to come. Choose the month of birth.`,
      },
    ];
  return [];
}

function toldProblems({ age, on }: WearerValues, today: IsoDate): Problem<"age" | "on">[] {
  const typed = digits(age);
  const problems: Problem<"age" | "on">[] = [];
  if (!/^\d+$/u.test(typed))
    problems.push({ field: "age", say: "Type the age in whole years, such as 7; under one year type 0." });
  else if (Number(typed) > OLDEST)
    problems.push({
      field: "age",
      say: `${Number(typed)} years is more than anyone has lived. Type the age in whole years, such as 7.`,
    });
  if (!isDay(on)) problems.push({ field: "on", say: "Choose the day on which this was the age." });
  else if (on > today)
    problems.push({ field: "on", say: "That day is still to come. Choose today or an earlier day." });
  else if (problems.length === 0 && Number(typed) + monthsBetween(on, today) / 12 > OLDEST)
    problems.push({
      field: "on",
      say: "At this age on that day, nobody would be alive now. Choose a later day.",
    });
  return problems;
}

/** What must be typed otherwise before a wearer can be kept, field by field, in the order of the form. */
export function wearerProblems(values: WearerValues, today: IsoDate): Problem<keyof WearerValues>[] {
  const name = values.name.trim();
  return [
    ...(name === ""
      ? [{ field: "name" as const, say: "Type the name of the one who will wear it." }]
      : name.length > NAME_AT_MOST
        ? [
            {
              field: "name" as const,
              say: `Type a name of at most ${NAME_AT_MOST} letters; the rest can stand in the note.`,
            },
          ]
        : []),
    ...(values.known === "born" ? birthProblems(values, today) : []),
    ...(values.known === "told" ? toldProblems(values, today) : []),
  ];
}

export const wearerShape = z.object({
  name: z.string(),
  known: z.enum(["born", "told", "grown"]),
  month: z.string(),
  year: z.string(),
  age: z.string(),
  on: z.string(),
  note: z.string(),
});

/** The form's schema; `today` is today's date where she is. */
export const wearerSchema = (today: IsoDate) =>
  wearerShape.superRefine((values, context) => {
    for (const { field, say } of wearerProblems(values, today))
      context.addIssue({ code: "custom", path: [field], message: say });
  });

/** The row's fields, from values without problems. */
export function wearerFields(values: WearerValues, clientId: string): WearerFields {
  const { known } = values;
  return {
    clientId,
    name: values.name.trim().replace(/\s+/gu, " "),
    birthYear: known === "born" ? Number(digits(values.year)) : null,
    birthMonth: known === "born" && values.month !== "" ? Number(values.month) : null,
    ageYears: known === "told" ? Number(digits(values.age)) : null,
    ageOn: known === "told" ? values.on : null,
    note: values.note.trim(),
  };
}

/** A kept wearer as the form shows it. */
export function wearerValues(wearer: Wearer, today: IsoDate): WearerValues {
  const text = (value: number | null) => (value === null ? "" : String(value));
  return {
    name: wearer.name,
    known: wearer.birthYear !== null ? "born" : wearer.ageYears !== null ? "told" : "grown",
    month: text(wearer.birthMonth),
    year: text(wearer.birthYear),
    age: text(wearer.ageYears),
    on: wearer.ageOn ?? today,
    note: wearer.note,
  };
}
