export interface Turns {
  /** No turn goes on for longer than this, or than one item, ms. */
  turnMs: number;
  now(): number;
  /** Lets the screen answer; resolves when it has. */
  pause(): Promise<void>;
  onTurn?(done: number): void;
  signal?: AbortSignal;
}

/** `items.map(work)` in turns short enough that the screen goes on answering. Null where it was called off. */
export async function inTurns<T, R>(
  items: readonly T[],
  work: (item: T) => R,
  { now, onTurn, pause, signal, turnMs }: Turns,
): Promise<R[] | null> {
  const made: R[] = [];
  while (made.length < items.length) {
    const until = now() + turnMs;
    do made.push(work(items[made.length]!));
    while (made.length < items.length && now() < until);
    if (made.length === items.length) break;
    onTurn?.(made.length);
    await pause();
    if (signal?.aborted) return null;
  }
  return signal?.aborted ? null : made;
}
