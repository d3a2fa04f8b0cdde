import { Screen } from "@/components/ui/screen";

export default function Page() {
  return <Screen title="clients">{null}</Screen>;
}
