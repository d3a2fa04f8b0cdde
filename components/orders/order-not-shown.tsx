import { type Viewed } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";

export const backToOrders = { href: "/orders", label: "Orders" };

/** In place of a screen whose row is not known: still opening, failed, or not in the book. */
export function OrderNotShown({
  title,
  state,
  say,
}: {
  title: string;
  state: Viewed<unknown>["state"];
  /** What is not here, where the book has answered. */
  say: string;
}) {
  return (
    <Screen title={title} back={backToOrders}>
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {state === "known" && (
        <Notice tone="look" title={say} action={<ButtonLink href="/orders">All orders</ButtonLink>}>
          <p>It may be in another book, or the link may be cut short.</p>
        </Notice>
      )}
    </Screen>
  );
}
