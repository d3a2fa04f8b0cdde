import { CloudOff, CloudUpload, HardDriveDownload, LoaderCircle } from "lucide-react";

export type KeptLineProps = {
  /** Changes kept here and not yet sent; null where there is no server to send to. */
  waiting: number | null;
  /** Since when the oldest waits, in words ready to print: "Tuesday", "14:20". */
  since?: string;
  /** `opening` the database of the phone opens; `reading` it is filled from the journal or the server. */
  state: "ready" | "opening" | "reading";
  /** How far reading is. */
  progress?: { done: number; total: number };
};

const changes = (count: number) => `${count} ${count === 1 ? "change" : "changes"} to send`;

const words = ({ waiting, since, state, progress }: KeptLineProps): string => {
  if (state === "opening") return "Opening the book on this phone";
  if (state === "reading")
    return progress ? `Reading the book, ${progress.done} of ${progress.total}` : "Reading the book";
  if (waiting === null) return "Kept on this phone";
  if (waiting === 0) return "Kept on this phone · all sent";
  return `Kept on this phone · ${changes(waiting)}${since ? `, since ${since}` : ""}`;
};

/** The line at the top of every screen: what is kept, and what is still to be sent. */
export function KeptLine(props: KeptLineProps) {
  const { waiting, state } = props;
  const Sign =
    state !== "ready"
      ? LoaderCircle
      : waiting === null
        ? CloudOff
        : waiting
          ? CloudUpload
          : HardDriveDownload;
  return (
    <p role="status" className="kept-line">
      <Sign aria-hidden="true" className="size-4 shrink-0" />
      <span>{words(props)}</span>
    </p>
  );
}
