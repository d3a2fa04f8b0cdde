import { type Turns } from "@/lib/many/in-turns";

/** Turns that leave the screen time for a frame and a tap. */
export const screenTurns: Pick<Turns, "turnMs" | "now" | "pause"> = {
  turnMs: 24,
  now: () => performance.now(),
  pause: () => new Promise((resolve) => setTimeout(resolve, 0)),
};
