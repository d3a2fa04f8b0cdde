"use client";

import { useState } from "react";
import { keepProblem } from "@/lib/store/keep-problem";
import { clearPhone } from "@/lib/workshop/clear-phone";
import { newPage } from "@/lib/workshop/new-page";

/** Clears everything and begins again at the start; `problem` says why it could not, with nothing cleared. */
export function useClearing() {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const clear = async () => {
    setBusy(true);
    setProblem(null);
    try {
      await clearPhone();
      newPage("/start");
    } catch (error) {
      setBusy(false);
      setProblem(keepProblem(error).message.replace("Not kept", "Not cleared"));
    }
  };
  return { clear, busy, problem };
}
