"use client";

import { type PointerEvent, type ReactNode, useRef, useState } from "react";
import { Maximize2 } from "lucide-react";
import { makeSleeve } from "@/lib/drafting";
import { type Fineness, type Unit } from "@/lib/records/types";
import { boxOf, steadyBox } from "@/lib/sleeves/drawing-paths";
import { fitView, type Size, toScreen, type View } from "@/lib/sleeves/drawing-view";
import {
  draggedFigure,
  type HandleName,
  handleNames,
  handlePoint,
  nearestHandle,
} from "@/lib/sleeves/handles";
import { layPieces } from "@/lib/sleeves/lay-pieces";
import { type GoodSleeve as Good } from "@/lib/sleeves/make-style-from-record";
import { type FigureKey } from "@/lib/sleeves/sleeve-figures";
import { Tape } from "@/components/ui/tape";
import { LookClosely, type Plan } from "./look-closely";
import { nameRoom, PiecesDrawing, piecesRoom } from "./pieces-drawing";
import { labelRoom, SleeveDrawing } from "./sleeve-drawing";
import { useSize } from "./use-size";
import "./sleeves.css";

export interface DrawingPanelProps {
  /** The sleeve, or the last that could be drawn; null while there is none yet. */
  made: Good | null;
  faint: boolean;
  focus: FigureKey | null;
  unit: Unit;
  fineness: Fineness;
  label: string;
  /** What is said above the drawing. */
  head: ReactNode;
  /** A handle was dragged. */
  onFigure(name: HandleName, mm: number): void;
}

interface Drag {
  name: HandleName;
  pointer: number;
  from: { x: number; y: number };
  made: Good;
  view: View;
  /** What is said above must not push the paper from under the finger, px. */
  headHeight: number;
}

/** The drawing above the figures: it stays in view, and can be taken by its handles. */
export function DrawingPanel(props: DrawingPanelProps) {
  const { faint, fineness, focus, head, label, made, onFigure, unit } = props;
  const [ref, size] = useSize<HTMLDivElement>();
  const headRef = useRef<HTMLDivElement>(null);
  const [drag, setDrag] = useState<Drag | null>(null);
  const [closely, setClosely] = useState(false);
  const plain = made?.style === "plain";
  const planFor = (one: Good, paper: Size, box = boxOf(one.draft)): Plan =>
    one.style === "plain"
      ? {
          box,
          room: labelRoom,
          draw: (view) => (
            <SleeveDrawing
              {...{ size: paper, view, unit, fineness, focus, faint, label }}
              figures={one.figures}
              draft={one.draft}
            />
          ),
        }
      : piecesPlan(one, paper, { faint, label });
  const plan = made && size && planFor(made, size, steadyBox(made.draft));
  const view = made && size && plan && (drag ? draggedView(drag, made) : fitView(plan.box, size, plan.room));

  return (
    <section aria-label="Drawing" className="drawing-panel">
      <div
        ref={headRef}
        className="min-h-[5.75rem] shrink-0 overflow-hidden px-4 py-1.5 lg:min-h-0"
        style={drag ? { height: drag.headHeight, minHeight: 0 } : undefined}
      >
        {head}
      </div>
      <Tape unit={unit} className="shrink-0" />
      <div ref={ref} className="marking-paper">
        {made && plan && view ? (
          <>
            {plan.draw(view)}
            {plain && (
              <Handles
                {...{ made, view, drag }}
                onTake={(taken) =>
                  setDrag(taken && { ...taken, headHeight: headRef.current?.offsetHeight ?? 0 })
                }
                onMove={(now, at) => {
                  const by = {
                    x: (at.x - now.from.x) / now.view.scale,
                    y: (at.y - now.from.y) / now.view.scale,
                  };
                  onFigure(now.name, draggedFigure(now.name, now.made.figures, by, unit, fineness));
                }}
              />
            )}
            <button
              type="button"
              onClick={() => setClosely(true)}
              className="absolute end-1 bottom-1 flex size-target items-center justify-center rounded border-2 border-edge bg-well"
            >
              <Maximize2 aria-hidden="true" className="size-5" />
              <span className="sr-only">Look closely</span>
            </button>
            {plain && (
              <span aria-hidden="true" className="absolute start-2 bottom-1 text-fine text-soft">
                {unit === "in" ? "inches" : "cm"}
              </span>
            )}
            <span aria-hidden="true" className="absolute start-2 top-1 text-fine text-soft">
              front
            </span>
            <span aria-hidden="true" className="absolute end-2 top-1 text-fine text-soft">
              back
            </span>
            <LookClosely plan={(paper) => planFor(made, paper)} open={closely} onOpenChange={setClosely} />
          </>
        ) : (
          !made && size && <Example {...{ size, unit, fineness, focus }} />
        )}
      </div>
    </section>
  );
}

/** The pieces beside each other, as suits the shape of the paper. */
function piecesPlan({ pieces }: Good, size: Size, rest: { faint: boolean; label: string }): Plan {
  const { left, right, top, bottom } = piecesRoom;
  const aspect = Math.max(1, size.width - left - right) / Math.max(1, size.height - top - bottom);
  const bare = fitView(layPieces(pieces, aspect, 0).box, size, piecesRoom);
  const laid = layPieces(pieces, aspect, nameRoom / bare.scale);
  return {
    box: laid.box,
    room: piecesRoom,
    draw: (view) => <PiecesDrawing {...{ laid, size, view }} {...rest} />,
  };
}

/** The child's sleeve of the hand practice (B 12 in, C 6 1/4 in): what the names mean, until there is a sleeve of one's own. */
const example = makeSleeve({ length: 230, capDepth: 158.75, biceps: 304.8, hem: 280 });

function Example({ size, ...rest }: { size: Size; unit: Unit; fineness: Fineness; focus: FigureKey | null }) {
  if (!example.ok) return null;
  return (
    <SleeveDrawing
      {...rest}
      named
      figures={example.figures}
      draft={example.draft}
      size={size}
      view={fitView(steadyBox(example.draft), size, { ...labelRoom, left: 64 })}
      label="An example of a sleeve, with what its length, cap depth, biceps line and hem are."
    />
  );
}

/** While a handle is held the paper stands still; for the crown, the cap line does. */
function draggedView({ made: before, name, view }: Drag, now: Good): View {
  if (name !== "capDepth") return view;
  return { ...view, y: view.y + (before.figures.capDepth - now.figures.capDepth) * view.scale };
}

interface HandlesProps {
  made: Good;
  view: View;
  drag: Drag | null;
  onTake(drag: Omit<Drag, "headHeight"> | null): void;
  onMove(drag: Drag, at: { x: number; y: number }): void;
}

/** For a finger; the same figures have keys beside their fields, for everyone. */
function Handles({ drag, made, onMove, onTake, view }: HandlesProps) {
  const down = (event: PointerEvent<HTMLDivElement>) => {
    const paper = event.currentTarget.parentElement?.getBoundingClientRect();
    if (drag || event.button !== 0 || !paper) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    const from = { x: event.clientX, y: event.clientY };
    const at = { x: from.x - paper.left, y: from.y - paper.top };
    onTake({ name: nearestHandle(at, made.draft, view), pointer: event.pointerId, from, made, view });
  };
  const move = (event: PointerEvent) => {
    if (drag?.pointer === event.pointerId) onMove(drag, { x: event.clientX, y: event.clientY });
  };
  const end = (event: PointerEvent) => {
    if (drag?.pointer === event.pointerId) onTake(null);
  };
  return handleNames.map((name) => {
    const { x, y } = toScreen(view, handlePoint(name, made.draft));
    return (
      <div
        key={name}
        aria-hidden="true"
        className="handle"
        data-handle={name}
        data-held={drag?.name === name || undefined}
        style={{ left: x, top: y }}
        onPointerDown={down}
        onPointerMove={move}
        onPointerUp={end}
        onPointerCancel={end}
        onLostPointerCapture={end}
      />
    );
  });
}
