"use client";

import { useSyncExternalStore } from "react";
import { Card, CardHead } from "@/components/ui/card";
import { Choice } from "@/components/ui/field";
import { chooseTheme, chosenTheme, subscribeTheme, type Theme } from "@/lib/workshop/theme";

const themes: { value: Theme; label: string }[] = [
  { value: "phone", label: "As the phone" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
];

/** Card in daylight, or navy paper at night. */
export function LookCard() {
  const theme = useSyncExternalStore(subscribeTheme, chosenTheme, () => "phone" as const);
  return (
    <Card aria-labelledby="look-title">
      <CardHead title="Light and dark" id="look-title" />
      <Choice
        bare
        label="Light or dark"
        name="theme"
        options={themes}
        value={theme}
        onChange={(event) => chooseTheme(event.target.value as Theme)}
      />
    </Card>
  );
}
