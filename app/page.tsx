import { Today } from "@/components/today/today";

export default function Page() {
  return <Today />;
}
