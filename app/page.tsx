import { TodayScreen } from "@/components/today/today-screen";

export default function Page() {
  return <TodayScreen />;
}
