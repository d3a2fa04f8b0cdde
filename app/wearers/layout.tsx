import { type ReactNode } from "react";
import { ClientsBeside } from "@/components/clients/clients-beside";

export default function Layout({ children }: { children: ReactNode }) {
  return <ClientsBeside>{children}</ClientsBeside>;
}
