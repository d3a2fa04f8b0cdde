import { type Metadata } from "next";
import { SettingsScreen } from "@/components/workshop/settings-screen";

export const metadata: Metadata = { title: "Workshop" };

export default function Page() {
  return <SettingsScreen />;
}
