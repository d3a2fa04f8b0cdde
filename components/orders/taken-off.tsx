import { Undo2 } from "lucide-react";
import { Button } from "@/components/ui/button";

/** What was just left out of a form, and the way to have it back. */
export function TakenOff({ what, onUndo }: { what: string | null; onUndo: () => void }) {
  return (
    <div role="status">
      {what !== null && (
        <div className="flex flex-wrap items-center justify-between gap-x-4 text-soft">
          <p className="wrap-anywhere">{what} is left out.</p>
          <Button variant="quiet" icon={<Undo2 className="size-5" />} onClick={onUndo}>
            Put it back
          </Button>
        </div>
      )}
    </div>
  );
}
