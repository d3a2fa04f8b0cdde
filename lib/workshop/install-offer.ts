/** The browser's offer to put Notchbook among the phone's own apps, kept by `earlyScript` until it is wanted. */

interface InstallOffer extends Event {
  prompt(): Promise<void>;
  userChoice: Promise<{ outcome: "accepted" | "dismissed" }>;
}

declare global {
  interface Window {
    notchbookInstall?: InstallOffer | null;
  }
}

/** "offered": the browser will do it when told. "by-hand": only from its menu. */
export type InstallState = "installed" | "offered" | "by-hand";

export function installState(): InstallState {
  const alone =
    matchMedia("(display-mode: standalone)").matches ||
    ("standalone" in navigator && navigator.standalone === true);
  if (alone) return "installed";
  return window.notchbookInstall ? "offered" : "by-hand";
}

const said = ["notchbook-install", "appinstalled"] as const;

export function subscribeInstall(listener: () => void): () => void {
  for (const name of said) window.addEventListener(name, listener);
  return () => {
    for (const name of said) window.removeEventListener(name, listener);
  };
}

/** Asks the browser to install; true where the user said yes. An offer is good for one asking. */
export async function install(): Promise<boolean> {
  const offer = window.notchbookInstall;
  if (!offer) return false;
  window.notchbookInstall = null;
  await offer.prompt();
  const { outcome } = await offer.userChoice;
  window.dispatchEvent(new Event("notchbook-install"));
  return outcome === "accepted";
}
