"use client";

import { type KeyboardEvent, type PointerEvent, type ReactNode, useEffect, useRef, useState } from "react";
import { Dialog } from "radix-ui";
import { Minus, Plus, Scan, X } from "lucide-react";
import { type Point } from "@/lib/drafting";
import {
  type Box,
  fitView,
  panned,
  pinched,
  type Room,
  type Size,
  type View,
  zoomAt,
} from "@/lib/sleeves/drawing-view";
import { Button } from "@/components/ui/button";
import { useSize } from "./use-size";

/** What is drawn, for a paper of such a size. */
export interface Plan {
  box: Box;
  room: Room;
  draw(view: View): ReactNode;
}

export interface LookCloselyProps {
  plan(size: Size): Plan;
  open: boolean;
  onOpenChange(open: boolean): void;
}

/** The drawing alone on the screen, to pinch, drag and zoom. */
export function LookClosely({ open, onOpenChange, plan }: LookCloselyProps) {
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Portal>
        <Dialog.Content className="closely">
          <Paper
            plan={plan}
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

function Paper({ head, plan }: PaperProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const [moved, setMoved] = useState<View | null>(null);
  const fingers = useRef(new Map<number, Point>());
  const surface = useRef<HTMLDivElement | null>(null);
  const planned = size && plan(size);
  const fitted = size && planned && fitView(planned.box, size, planned.room);
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
        {planned && view && planned.draw(view)}
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
