"use client";

import { useEffect, useState } from "react";

/** A text once it has stood still for `ms`, so that the database is not asked at each letter. */
export function useSettled(text: string, ms: number): string {
  const [settled, setSettled] = useState(text);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text), ms);
    return () => clearTimeout(timer);
  }, [text, ms]);
  return settled;
}
