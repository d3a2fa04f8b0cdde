"use client";

import { useEffect, useState } from "react";
import { type ReadPhone } from "@/lib/people/phone";

/** The tables of all countries' numbers are heavy, so they come when there is a number to read. */
const loadReader = () => import("@/lib/people/phone");

const READ_AFTER_MS = 300;

/** What a phone reads as in `country`; null while it is not read yet, or cannot be. */
export function usePhoneReading(phone: string, country: string): ReadPhone | null {
  const [read, setRead] = useState<ReadPhone | null>(null);
  useEffect(() => {
    if (phone.trim() === "") return;
    let current = true;
    const timer = setTimeout(() => {
      loadReader().then(
        ({ readPhone }) => current && setRead(readPhone(phone, country)),
        () => undefined,
      );
    }, READ_AFTER_MS);
    return () => {
      current = false;
      clearTimeout(timer);
    };
  }, [phone, country]);
  return read !== null && read.typed === phone ? read : null;
}

/** The number in E.164, or null where it cannot be read: then it stays as typed, which is enough to keep it. */
export async function readE164(phone: string, country: string): Promise<string | null> {
  if (phone.trim() === "") return null;
  try {
    const { readPhone } = await loadReader();
    return readPhone(phone, country).e164 ?? null;
  } catch {
    return null;
  }
}
