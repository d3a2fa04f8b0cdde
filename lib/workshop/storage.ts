/** Whether the browser may throw the book away when the phone is short of room, and how much room there is. */

/** "unknown": this browser does not say. */
export type Staying = "stays" | "may-go" | "unknown";

export interface PhoneRoom {
  staying: Staying;
  usage: number | undefined;
  quota: number | undefined;
}

export async function lookAtStorage(): Promise<PhoneRoom> {
  const storage = navigator.storage as StorageManager | undefined;
  const staying = await storage?.persisted?.().catch(() => undefined);
  const estimate = await storage?.estimate?.().catch(() => undefined);
  return {
    staying: staying === undefined ? "unknown" : staying ? "stays" : "may-go",
    usage: estimate?.usage,
    quota: estimate?.quota,
  };
}

/** Asks that what is kept be never thrown away to make room; some browsers ask the user, others decide alone. */
export async function askToStay(): Promise<Staying> {
  const storage = navigator.storage as StorageManager | undefined;
  const granted = await storage?.persist?.().catch(() => undefined);
  return granted === undefined ? "unknown" : granted ? "stays" : "may-go";
}
