import { type ReactNode } from "react";
import { TabBar } from "@/components/shell/tab-bar";

export type ShellProps = {
  /** The KeptLine. */
  kept?: ReactNode;
  /** UpdateBanner, OfflineReady. */
  banners?: ReactNode;
  /** A Screen. */
  children: ReactNode;
};

/** What stands around every screen of the app: the way past the bar, the bar, the line that says what is kept. */
export function Shell({ kept, banners, children }: ShellProps) {
  return (
    <div className="shell">
      <a href="#main" className="skip-link">
        Go to the screen
      </a>
      <div className="shell-frame">
        <TabBar />
        <div className="shell-body">
          {kept}
          {banners}
          {children}
        </div>
      </div>
    </div>
  );
}
