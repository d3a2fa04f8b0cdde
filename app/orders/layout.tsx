import { type ReactNode } from "react";
import { OrdersBeside } from "@/components/orders/orders-beside";

export default function Layout({ children }: { children: ReactNode }) {
  return <OrdersBeside>{children}</OrdersBeside>;
}
