import { type Metadata } from "next";
import { BinScreen } from "@/components/bin/bin-screen";

export const metadata: Metadata = { title: "The bin" };

export default function Page() {
  return <BinScreen />;
}
