import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";
import { type Viewed } from "@/components/store/use-book";

export const backToClients = { href: "/clients", label: "Clients" };

/** In place of a card whose row is not known: still opening, failed, or not in the book. */
export function NotShown({
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
    <Screen title={title} back={backToClients}>
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice
          tone="wrong"
          title="The book on this phone did not answer. Close Notchbook and open it again."
        />
      )}
      {state === "known" && (
        <Notice tone="look" title={say} action={<ButtonLink href="/clients">All clients</ButtonLink>}>
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
