/**
 * Stamps (sync contract C2): a hybrid logical clock written so that it sorts as text:
 * 12 hex digits of milliseconds, 4 of counter, then the device id. Pure; the caller keeps the clock.
 */

export interface Clock {
  /** Milliseconds of the last stamp given. */
  ms: number;
  /** How many stamps that millisecond has had. */
  counter: number;
}

export const newClock: Clock = { ms: 0, counter: 0 };

const COUNTER_MAX = 0xffff;

/**
 * The clock after one tick at wall time `now` (ms). Never runs backwards: a wall clock that was put back goes
 * on counting at the highest moment seen. A full counter borrows the next millisecond.
 */
export function tick(clock: Clock, now: number): Clock {
  if (now > clock.ms) return { ms: Math.floor(now), counter: 0 };
  if (clock.counter >= COUNTER_MAX) return { ms: clock.ms + 1, counter: 0 };
  return { ms: clock.ms, counter: clock.counter + 1 };
}

/** Writes a stamp. `device` is the device's UUID. */
export function writeStamp(clock: Clock, device: string): string {
  const ms = clock.ms.toString(16).padStart(12, "0");
  const counter = clock.counter.toString(16).padStart(4, "0");
  return `${ms}-${counter}-${device}`;
}

export interface StampParts extends Clock {
  device: string;
}

/** Reads a stamp. Throws on text that no `writeStamp` made. */
export function readStamp(stamp: string): StampParts {
  const match = /^([0-9a-f]{12})-([0-9a-f]{4})-(.+)$/.exec(stamp);
  if (!match) throw new Error(`Not a stamp: ${stamp}`);
  return { ms: parseInt(match[1]!, 16), counter: parseInt(match[2]!, 16), device: match[3]! };
}

/** The clock after a stamp was seen: later stamps of this device must sort after it. */
export function observe(clock: Clock, stamp: string): Clock {
  const { ms, counter } = readStamp(stamp);
  return ms > clock.ms || (ms === clock.ms && counter > clock.counter) ? { ms, counter } : clock;
}
