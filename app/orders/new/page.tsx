import { Screen } from "@/components/ui/screen";

export default function Page() {
  return <Screen title="orders new">{null}</Screen>;
}
