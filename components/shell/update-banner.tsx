import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";

export type UpdateBannerProps = {
  /** A new version is on this phone and waits. */
  ready: boolean;
  /** Take it: the screen opens again. */
  onUse: () => void;
  onLater?: () => void;
};

/** A new version waits for the user's word: it never takes over a half-filled form. */
export function UpdateBanner({ ready, onUse, onLater }: UpdateBannerProps) {
  if (!ready) return null;
  return (
    <div className="banner">
      <Notice
        live
        title="A newer Notchbook is ready"
        action={
          <>
            <Button onClick={onUse}>Use it now</Button>
            {onLater && (
              <Button variant="quiet" onClick={onLater}>
                Later
              </Button>
            )}
          </>
        }
      >
        <p>Finish what you are typing first. What is kept stays kept.</p>
      </Notice>
    </div>
  );
}
