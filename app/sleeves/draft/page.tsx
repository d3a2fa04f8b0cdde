import { Screen } from "@/components/ui/screen";

export default function Page() {
  return <Screen title="sleeves draft">{null}</Screen>;
}
