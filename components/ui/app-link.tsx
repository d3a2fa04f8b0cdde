import Link from "next/link";
import { type ComponentProps } from "react";

export type AppLinkProps = Omit<ComponentProps<typeof Link>, "prefetch">;

/**
 * The only way one screen links to another. Next would ask the network for every link in view; with no data that
 * fills the log with failures, and the service worker has every screen already.
 */
export function AppLink(props: AppLinkProps) {
  return <Link {...props} prefetch={false} />;
}
