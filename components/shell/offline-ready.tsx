import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";

export type OfflineReadyProps = {
  /** Every screen is now on the phone. */
  ready: boolean;
  onClose: () => void;
};

/** Said once, after the first visit: from here on no data is needed. */
export function OfflineReady({ ready, onClose }: OfflineReadyProps) {
  if (!ready) return null;
  return (
    <div className="banner">
      <Notice
        live
        tone="good"
        title="Notchbook now works without data"
        action={<Button onClick={onClose}>Good</Button>}
      >
        <p>Every screen is on this phone. Aeroplane mode is fine.</p>
      </Notice>
    </div>
  );
}
