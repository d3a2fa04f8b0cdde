"use client";

import { useEffect, useState } from "react";

/** The moment, a minute fine; looked at again when the phone is taken in hand. */
export function useNow(): Date {
  const [now, setNow] = useState(() => new Date());
  useEffect(() => {
    const look = () => setNow(new Date());
    const timer = setInterval(look, 60_000);
    document.addEventListener("visibilitychange", look);
    return () => {
      clearInterval(timer);
      document.removeEventListener("visibilitychange", look);
    };
  }, []);
  return now;
}
