"use client";

import { useState } from "react";
import { type StyleId } from "@/lib/records/types";
import { type GoodSleeve, type StyledSleeve } from "@/lib/sleeves/make-style-from-record";

/**
 * The sleeve, or while it cannot be drawn the last of that style that could, or else the plain one it is made from; null
 * before the first.
 */
export function useLastGood(made: StyledSleeve | null, style: StyleId): GoodSleeve | null {
  const [last, setLast] = useState<GoodSleeve | null>(null);
  if (made?.ok) {
    if (made !== last) setLast(made);
    return made;
  }
  return last?.style === style ? last : (made?.block ?? last);
}
