import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type Viewed } from "@/components/store/use-book";

interface Place {
  href: string;
  label: string;
}

export const backToClients: Place = { href: "/clients", label: "Clients" };
export const backToOrders: Place = { href: "/orders", label: "Orders" };
export const backToSleeves: Place = { href: "/sleeves", label: "Sleeves" };

/** In place of a screen whose row is not known: still opening, failed, or not in the book. */
export function NotShown({
  title,
  back,
  state,
  say,
}: {
  title: string;
  /** The list that the row would stand in. */
  back: Place;
  state: Viewed<unknown>["state"];
  /** What is not here, where the book has answered. */
  say: string;
}) {
  return (
    <Screen title={title} back={back}>
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {state === "known" && (
        <Notice
          tone="look"
          title={say}
          action={<ButtonLink href={back.href}>All {back.label.toLowerCase()}</ButtonLink>}
        >
          <p>It may be in another book, or the link may be cut short.</p>
        </Notice>
      )}
    </Screen>
  );
}

/** What stands on a screen until its address has been read. */
export function ScreenOpening({ title }: { title: string }) {
  return (
    <Screen title={title}>
      <Progress label="Opening the book" />
    </Screen>
  );
}
