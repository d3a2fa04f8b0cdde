import { type Metadata } from "next";
import { SleeveListScreen } from "@/components/sleeves/sleeve-list-screen";

export const metadata: Metadata = { title: "Sleeves" };

export default function Page() {
  return <SleeveListScreen />;
}
