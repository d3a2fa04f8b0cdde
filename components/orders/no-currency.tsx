import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Screen } from "@/components/ui/screen";
import { backToOrders } from "@/components/frame/not-shown";

/** In place of a form for money where nobody pays in the currency that is set down. */
export function NoCurrency({ title, code }: { title: string; code: string }) {
  return (
    <Screen title={title} back={backToOrders}>
      <Notice
        tone="look"
        title={`${code || "The currency"} is not a currency that people pay in.`}
        action={<ButtonLink href="/settings">Choose the currency</ButtonLink>}
      >
        <p>Choose one under Workshop, then take the order.</p>
      </Notice>
    </Screen>
  );
}
