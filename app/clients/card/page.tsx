import { Screen } from "@/components/ui/screen";

export default function Page() {
  return <Screen title="clients card">{null}</Screen>;
}
