"use client";

import { useState } from "react";
import { type MadeSleeve } from "@/lib/drafting";

type Good = MadeSleeve & { ok: true };

/** The sleeve, or while it cannot be drawn the last that could; null before the first. */
export function useLastGood(made: MadeSleeve | null): Good | null {
  const [last, setLast] = useState<Good | null>(null);
  if (made?.ok && made !== last) setLast(made);
  return made?.ok ? made : last;
}
