"use client";

import { useSearchParams } from "next/navigation";
import { validate } from "uuid";

/** A row's id from the query of the address; null where there is none, or what stands there is no id. */
export function useIdParam(name: string): string | null {
  const id = useSearchParams().get(name);
  return id !== null && validate(id) ? id : null;
}
