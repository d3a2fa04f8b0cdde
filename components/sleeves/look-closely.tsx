"use client";

import { type KeyboardEvent, type PointerEvent, type ReactNode, useEffect, useRef, useState } from "react";
import { Dialog } from "radix-ui";
import { Minus, Plus, Scan, X } from "lucide-react";
import { type MadeSleeve, type Point } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import { boxOf } from "@/lib/sleeves/drawing-paths";
import { fitView, panned, pinched, type View, zoomAt } from "@/lib/sleeves/drawing-view";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";
import { Button } from "@/components/ui/button";
import { labelRoom, SleeveDrawing } from "./sleeve-drawing";
import { useSize } from "./use-size";

export interface LookCloselyProps {
  made: MadeSleeve & { ok: true };
  focus: FigureKey | null;
  faint: boolean;
  unit: Unit;
  fineness: Fineness;
  label: string;
  open: boolean;
  onOpenChange(open: boolean): void;
}

/** The drawing alone on the screen, to pinch, drag and zoom. */
export function LookClosely({ open, onOpenChange, ...rest }: LookCloselyProps) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Portal>
        <Dialog.Content className="closely">
          <Paper
            {...rest}
            head={
              <div className="flex items-center justify-between gap-2 px-4 py-2">
                <Dialog.Title className="font-figure text-lg font-bold">Look closely</Dialog.Title>
                <Dialog.Description className="sr-only">
                  Drag to move the paper. Pinch, or press plus and minus, to zoom; 0 shows the whole sleeve.
                </Dialog.Description>
                <Dialog.Close className="flex size-target shrink-0 items-center justify-center rounded border-2 border-edge bg-well">
                  <X aria-hidden="true" className="size-5" />
                  <span className="sr-only">Close</span>
                </Dialog.Close>
              </div>
            }
          />
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}

const zoomStep = 1.4;
const panStep = 60;

type PaperProps = Omit<LookCloselyProps, "open" | "onOpenChange"> & { head: ReactNode };

function Paper({ faint, fineness, focus, head, label, made, unit }: PaperProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const [moved, setMoved] = useState<View | null>(null);
  const fingers = useRef(new Map<number, Point>());
  const surface = useRef<HTMLDivElement | null>(null);
  const fitted = size && fitView(boxOf(made.draft), size, labelRoom);
  const view = moved ?? fitted;

  const change = (next: (view: View, fitted: View) => View) => {
    if (!fitted) return;
    setMoved((before) => next(before ?? fitted, fitted));
  };
  const zoom = (factor: number) => {
    if (!size) return;
    change((now, whole) => zoomAt(now, { x: size.width / 2, y: size.height / 2 }, factor, whole));
  };

  useEffect(() => {
    const element = surface.current;
    if (!element || !fitted) return;
    // React listens for the wheel passively; the page must not scroll below the drawing.
    const wheel = (event: WheelEvent) => {
      event.preventDefault();
      const { left, top } = element.getBoundingClientRect();
      const at = { x: event.clientX - left, y: event.clientY - top };
      setMoved((before) => zoomAt(before ?? fitted, at, Math.exp(-event.deltaY / 500), fitted));
    };
    element.addEventListener("wheel", wheel, { passive: false });
    return () => element.removeEventListener("wheel", wheel);
  });

  const place = (event: PointerEvent): Point => {
    const { left, top } = event.currentTarget.getBoundingClientRect();
    return { x: event.clientX - left, y: event.clientY - top };
  };
  const down = (event: PointerEvent) => {
    event.currentTarget.setPointerCapture(event.pointerId);
    if (fingers.current.size < 2) fingers.current.set(event.pointerId, place(event));
  };
  const move = (event: PointerEvent) => {
    const before = fingers.current.get(event.pointerId);
    if (!before) return;
    const now = place(event);
    const other = [...fingers.current].find(([id]) => id !== event.pointerId)?.[1];
    fingers.current.set(event.pointerId, now);
    change((seen, whole) =>
      other
        ? pinched(seen, [before, other], [now, other], whole)
        : panned(seen, now.x - before.x, now.y - before.y),
    );
  };
  const up = (event: PointerEvent) => fingers.current.delete(event.pointerId);

  const keys = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const by: Record<string, () => void> = {
      "+": () => zoom(zoomStep),
      "=": () => zoom(zoomStep),
      "-": () => zoom(1 / zoomStep),
      "0": () => setMoved(null),
      ArrowLeft: () => change((seen) => panned(seen, panStep, 0)),
      ArrowRight: () => change((seen) => panned(seen, -panStep, 0)),
      ArrowUp: () => change((seen) => panned(seen, 0, panStep)),
      ArrowDown: () => change((seen) => panned(seen, 0, -panStep)),
    };
    if (!by[event.key]) return;
    event.preventDefault();
    by[event.key]!();
  };

  return (
    <div className="flex min-h-0 flex-1 flex-col" onKeyDown={keys}>
      {head}
      <div ref={ref} className="marking-paper">
        {size && view && (
          <SleeveDrawing
            {...{ size, view, unit, fineness, focus, faint, label }}
            figures={made.figures}
            draft={made.draft}
          />
        )}
        <div
          ref={surface}
          className="absolute inset-0 cursor-grab touch-none"
          onPointerDown={down}
          onPointerMove={move}
          onPointerUp={up}
          onPointerCancel={up}
          onLostPointerCapture={up}
        />
      </div>
      <div className="grid grid-cols-3 gap-2 p-2 pb-[calc(0.5rem+env(safe-area-inset-bottom))]">
        <Button icon={<Minus className="size-5" />} onClick={() => zoom(1 / zoomStep)}>
          Smaller
        </Button>
        <Button icon={<Scan className="size-5" />} onClick={() => setMoved(null)}>
          Whole
        </Button>
        <Button icon={<Plus className="size-5" />} onClick={() => zoom(zoomStep)}>
          Larger
        </Button>
      </div>
    </div>
  );
}
