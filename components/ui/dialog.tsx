"use client";

import { type ReactNode } from "react";
import { AlertDialog, Dialog } from "radix-ui";
import { X } from "lucide-react";
import { Button } from "@/components/ui/button";

type Opening = {
  /** The button that opens it. Leave out when the caller keeps `open`. */
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
};

export type AskProps = Opening & {
  /** The question. */
  title: string;
  /** What will happen, in a sentence. */
  say: ReactNode;
  /** The words of the two keys: what each does, never "OK". `no` is "Go back" unless told. */
  yes: string;
  no?: string;
  /** What cannot be undone. */
  danger?: boolean;
  /** Called for `yes`; the question closes at once. */
  onYes: () => void;
};

/** A question to answer before going on: at the thumb on a phone, in the middle of a wide screen. */
export function Ask({
  trigger,
  open,
  onOpenChange,
  title,
  say,
  yes,
  no = "Go back",
  danger,
  onYes,
}: AskProps) {
  return (
    <AlertDialog.Root open={open} onOpenChange={onOpenChange}>
      {trigger && <AlertDialog.Trigger asChild>{trigger}</AlertDialog.Trigger>}
      <AlertDialog.Portal>
        <AlertDialog.Overlay className="sheet-shade" />
        <AlertDialog.Content className="sheet">
          <AlertDialog.Title className="font-figure text-lg font-bold">{title}</AlertDialog.Title>
          <AlertDialog.Description asChild>
            <div>{say}</div>
          </AlertDialog.Description>
          <div className="mt-2 grid gap-2">
            <AlertDialog.Action asChild>
              <Button variant={danger ? "danger" : "main"} full onClick={onYes}>
                {yes}
              </Button>
            </AlertDialog.Action>
            <AlertDialog.Cancel asChild>
              <Button full>{no}</Button>
            </AlertDialog.Cancel>
          </div>
        </AlertDialog.Content>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
}

export type SheetProps = Opening & {
  title: string;
  /** A sentence below the title. */
  say?: ReactNode;
  children: ReactNode;
};

/** A short form or a list to choose from, laid over the screen. Closes with its key, Escape, or a tap beside it. */
export function Sheet({ trigger, open, onOpenChange, title, say, children }: SheetProps) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      {trigger && <Dialog.Trigger asChild>{trigger}</Dialog.Trigger>}
      <Dialog.Portal>
        <Dialog.Overlay className="sheet-shade" />
        <Dialog.Content className="sheet" {...(!say && { "aria-describedby": undefined })}>
          <div className="flex items-start justify-between gap-3">
            <Dialog.Title className="pt-1.5 font-figure text-lg font-bold">{title}</Dialog.Title>
            <Dialog.Close className="flex size-target shrink-0 items-center justify-center rounded border-2 border-edge bg-well">
              <X aria-hidden="true" className="size-5" />
              <span className="sr-only">Close</span>
            </Dialog.Close>
          </div>
          {say && (
            <Dialog.Description asChild>
              <div className="text-soft">{say}</div>
            </Dialog.Description>
          )}
          {children}
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
