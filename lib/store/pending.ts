/**
 * Changes that are laid over what the database gives: kept ones that it may not have got yet, and recent ones
 * that it has. An outside store for React; every tab has one and hears of the others' changes.
 */
import { type Change } from "@/lib/journal/change";

/** Above this the database is being filled from a copy; the screen shows its progress instead. */
const ROWS_AT_MOST = 4000;
const APPLIED_AT_MOST = 300;

export class Pending {
  private held: readonly Change[] = [];
  private readonly listeners = new Set<() => void>();

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly all = (): readonly Change[] => this.held;

  /** The number of the newest change held, or 0. */
  get last(): number {
    return this.held.at(-1)?.number ?? 0;
  }

  add(changes: readonly Change[]): void {
    const known = new Set(this.held.map((change) => change.number));
    const fresh = changes.filter((change) => !known.has(change.number));
    if (fresh.length === 0) return;
    let merged = [...this.held, ...fresh].sort((a, b) => a.number - b.number);
    let rows = 0;
    const from = merged.findLastIndex((change) => (rows += change.rows.length) > ROWS_AT_MOST);
    merged = merged.slice(from + 1);
    this.become(merged);
  }

  /** Lets go of old changes that the database has; true where any went. */
  trim(applied: number): boolean {
    if (this.held.length <= APPLIED_AT_MOST) return false;
    const keepFrom = this.held.length - APPLIED_AT_MOST;
    const kept = this.held.filter((change, i) => i >= keepFrom || change.number > applied);
    if (kept.length === this.held.length) return false;
    this.become(kept);
    return true;
  }

  private become(next: readonly Change[]): void {
    this.held = next;
    for (const listener of this.listeners) listener();
  }
}
