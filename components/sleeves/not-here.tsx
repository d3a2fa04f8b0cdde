import { type Viewed } from "@/components/store/use-book";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { Screen } from "@/components/ui/screen";

export const backToSleeves = { href: "/sleeves", label: "Sleeves" };

/** In place of a sleeve, a wearer or a set that is not known: still opening, failed, or not in the book. */
export function NotHere({
  say,
  state,
  title,
}: {
  title: string;
  state: Viewed<unknown>["state"];
  say: string;
}) {
  return (
    <Screen title={title} back={backToSleeves}>
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
          action={
            <>
              <ButtonLink href="/sleeves">All sleeves</ButtonLink>
              <ButtonLink href="/sleeves/draft">Draft a sleeve</ButtonLink>
            </>
          }
        >
          <p>It may be in another book, or the link may be cut short.</p>
        </Notice>
      )}
    </Screen>
  );
}
