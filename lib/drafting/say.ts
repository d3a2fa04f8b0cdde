import { type Phrase } from "@/lib/drafting/types";

/** Builds a Phrase: in say`The hem is ${hem}.` a number is a length in mm, a string is words. */
export function say(words: TemplateStringsArray, ...values: readonly (number | string)[]): Phrase {
  const parts: (string | { mm: number })[] = [];
  const add = (text: string) => {
    const last = parts.at(-1);
    if (typeof last === "string") parts[parts.length - 1] = last + text;
    else if (text) parts.push(text);
  };
  for (const [i, text] of words.entries()) {
    add(text);
    const value = values[i];
    if (typeof value === "number") parts.push({ mm: value });
    else if (value !== undefined) add(value);
  }
  return parts;
}

const ORDINALS = ["first", "second", "third", "fourth", "fifth", "sixth"];

/** "second", for the mark with index 1. */
export function ordinal(index: number): string {
  return ORDINALS[index] ?? `${index + 1}th`;
}
