import { type Metadata } from "next";
import { StartScreen } from "@/components/start/start-screen";

export const metadata: Metadata = { title: "Begin" };

export default function Page() {
  return <StartScreen />;
}
