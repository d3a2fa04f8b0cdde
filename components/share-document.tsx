"use client";

import { useId, useRef, useState, useSyncExternalStore } from "react";
import { Download, Printer, Share2 } from "lucide-react";
import { Button } from "@/components/ui/button";
import { cx } from "@/components/ui/cx";
import { Choice } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { printFile, saveFile } from "@/lib/pdf/hand-over";
import { type OnProgress, sayPrintProblem } from "@/lib/pdf/pdf-api";
import { rememberedPaper, rememberPaper } from "@/lib/pdf/remember-paper";

export type ShareDocumentProps<Paper extends string> = {
  /** What it is, in a sentence: "receipt", "marks". */
  name: string;
  /** Makes the file; asked again for each paper, and whenever this function is another one. */
  make: (paper: Paper, onProgress: OnProgress) => Promise<Blob>;
  /** Without its ending. */
  fileName: string;
  papers: ReadonlyArray<{ value: Paper; label: string; sub?: string }>;
  /** Under which the last paper is remembered in this browser. Default: the name. */
  rememberAs?: string;
  className?: string;
};

type Way = "share" | "print" | "save";
type State =
  | { phase: "idle" }
  | { phase: "making"; way: Way; done: number; of: number }
  | { phase: "done"; say: string; more?: string }
  | { phase: "failed"; say: string; way: Way };

const never = () => () => undefined;
const canShareFiles = () =>
  typeof navigator.canShare === "function" &&
  navigator.canShare({ files: [new File([""], "paper.pdf", { type: "application/pdf" })] });

const isNamed = (error: unknown, name: string) => error instanceof Error && error.name === name;

/** Share, print or save a paper that is made when it is asked for. */
export function ShareDocument<Paper extends string>({
  name,
  make,
  fileName,
  papers,
  rememberAs = name,
  className,
}: ShareDocumentProps<Paper>) {
  const group = useId();
  const key = `notchbook-paper-${rememberAs}`;
  const last = useSyncExternalStore(
    never,
    () => rememberedPaper(key),
    () => null,
  );
  const [chosen, setChosen] = useState<Paper | null>(null);
  const paper = papers.find(({ value }) => value === (chosen ?? last))?.value ?? papers[0]?.value;
  const sharing = useSyncExternalStore(never, canShareFiles, () => false);
  const [state, setState] = useState<State>({ phase: "idle" });
  const kept = useRef<{ make: unknown; paper: Paper; file: File } | null>(null);

  const fileFor = async (wanted: Paper, way: Way): Promise<File> => {
    const held = kept.current;
    if (held?.make === make && held.paper === wanted && held.file.name === `${fileName}.pdf`)
      return held.file;
    setState({ phase: "making", way, done: 0, of: 0 });
    let made = false;
    // A last message about the way there may come in after the file.
    const blob = await make(wanted, (done, of) => {
      if (!made) setState({ phase: "making", way, done, of });
    }).finally(() => (made = true));
    const file = new File([blob], `${fileName}.pdf`, { type: "application/pdf" });
    kept.current = { make, paper: wanted, file };
    return file;
  };

  const share = async (file: File, hint?: string) => {
    try {
      await navigator.share({ files: [file], title: fileName });
      setState({ phase: "done", say: "Handed over to the app you chose." });
    } catch (error) {
      if (isNamed(error, "AbortError"))
        setState({ phase: "done", say: `Not shared. The ${name} is ready: choose again.` });
      // The browser shares only within seconds of a tap, and the paper took longer than that.
      else if (isNamed(error, "NotAllowedError"))
        setState({ phase: "done", say: `The ${name} is ready. Tap Share once more.`, more: hint });
      else {
        saveFile(file);
        setState({
          phase: "done",
          say: `This phone would not share it, so it was saved as ${file.name}.`,
          more: "Send it from your downloads.",
        });
      }
    }
  };

  const printOrHelp = async (file: File) => {
    try {
      await printFile(file);
      setState({
        phase: "done",
        say: "Sent to the printing window.",
        more: "Choose the paper's own size there, and 100 %: not “fit to page”.",
      });
    } catch {
      if (sharing) return share(file, "Then choose Print in the list, or your printer's own app.");
      saveFile(file);
      setState({
        phase: "done",
        say: `This browser cannot print from here, so it was saved as ${file.name}.`,
        more: "Open it from your downloads and print it there.",
      });
    }
  };

  const run = async (way: Way) => {
    if (!paper) return;
    rememberPaper(key, paper);
    try {
      const file = await fileFor(paper, way);
      if (way === "share") await share(file);
      else if (way === "print") await printOrHelp(file);
      else {
        saveFile(file);
        setState({ phase: "done", say: `Saved as ${file.name}, in your downloads.` });
      }
    } catch (error) {
      console.error("A paper could not be made.", error);
      setState({ phase: "failed", say: sayPrintProblem(error), way });
    }
  };

  const busyWith = state.phase === "making" ? state.way : null;
  const isBusy = (way: Way) => busyWith === way;
  const mustWait = (way: Way) => busyWith !== null && busyWith !== way;

  return (
    <div className={cx("grid gap-3", className)}>
      {papers.length > 1 && (
        <Choice
          label="Paper"
          name={group}
          options={papers}
          value={paper}
          disabled={busyWith !== null}
          onChange={(event) => {
            setChosen(event.target.value as Paper);
            setState({ phase: "idle" });
          }}
        />
      )}
      <div className="flex flex-wrap gap-2">
        {sharing && (
          <Button
            variant="main"
            icon={<Share2 className="size-5" />}
            busy={isBusy("share")}
            disabled={mustWait("share")}
            onClick={() => void run("share")}
          >
            Share
          </Button>
        )}
        <Button
          variant={sharing ? "plain" : "main"}
          icon={<Printer className="size-5" />}
          busy={isBusy("print")}
          disabled={mustWait("print")}
          onClick={() => void run("print")}
        >
          Print
        </Button>
        <Button
          icon={<Download className="size-5" />}
          busy={isBusy("save")}
          disabled={mustWait("save")}
          onClick={() => void run("save")}
        >
          Save
        </Button>
      </div>
      {state.phase === "making" && (
        <Progress
          label={`Making the ${name}`}
          value={state.of > 0 ? Math.round((100 * state.done) / state.of) : undefined}
        />
      )}
      <div role="status">
        {state.phase === "done" && (
          <Notice tone="good" title={state.say}>
            {state.more && <p>{state.more}</p>}
          </Notice>
        )}
      </div>
      {state.phase === "failed" && (
        <Notice
          tone="wrong"
          live
          title={state.say}
          action={<Button onClick={() => void run(state.way)}>Try again</Button>}
        />
      )}
    </div>
  );
}
