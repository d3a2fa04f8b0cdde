/**
 * Where the tape goes, as lines: a few neutral figures in one box of 120 by 132, and the run of the tape on them for
 * each measure. A drawing to find the place by, to no scale.
 */
import { type MeasureKey } from "@/lib/figures/body-measures";

export type FigureName = "front" | "back" | "arm" | "bent" | "hand";

export interface FigureLines {
  /** The body behind a limb: filled and outlined lightly. */
  backdrop?: string;
  /** What bounds the figure: filled and outlined. */
  body: string;
  /** Seams, folds and bones: thin. */
  detail: string;
  /** Cut into the hem of a stand: one is the front, two are the back. */
  notches?: string;
  /** The view box, where it is not the common one. */
  box?: [number, number, number, number];
}

const stand =
  "M52 9C52 17 50 20 43 22.5L28 29C32 38 35 47 31 58C33 70 40 78 40 88C40 100 34 108 32 119H88C86 108 80 100 80 88" +
  "C80 78 87 70 89 58C85 47 88 38 92 29L77 22.5C70 20 68 17 68 9Z";
const standBelow = "M52 9C55 11.5 65 11.5 68 9C65 6.5 55 6.5 52 9ZM60 119V129M48 129H72";

export const figureLines: Record<FigureName, FigureLines> = {
  front: {
    body: stand,
    detail: `${standBelow}M52 13C54 20 66 20 68 13M45 24C47 44 44 52 47 64S46 96 44 119M75 24C73 44 76 52 73 64S74 96 76 119`,
    notches: "M55 119H65L60 112Z",
  },
  back: {
    body: stand,
    detail: `${standBelow}M60 11V119M46 30C50 48 50 60 48 74S47 104 46 119M74 30C70 48 70 60 72 74S73 104 74 119`,
    notches: "M49 119H59L54 112ZM61 119H71L66 112Z",
  },
  // The left arm hanging, with the neck and the side of the body it hangs from; cut off by the frame.
  arm: {
    box: [-4.5, 0, 98, 132],
    body:
      "M24.8 -5.3C25.7 14.1 37.1 19.4 53 22C67 24.6 75 33.4 76.7 47.5C77.6 59.8 75.8 70.4 75.8 81" +
      "C76.7 95 75 114.4 73.2 137.3H60.9C59.1 119.7 53.8 98.6 55.6 81.8C55.6 72.2 54.7 63.4 53 54.6" +
      "C53.8 68.6 48.6 82.7 45 93.3C45 105.6 46.8 119.7 47.7 137.3H-6V-5.3Z",
    detail: "M53.8 22.9C47.7 31.7 46.8 44 53 54.6M57.4 81.8Q60 84.5 62.6 82.7M45 93.3Q26.6 97.7 -6 96.8",
  },
  // The arm bent at the elbow, seen from its own side, before the body.
  bent: {
    backdrop:
      "M45.9 5.3C45.9 13.2 42.4 18.5 37.1 22C30.1 37 31.8 72.2 40.6 91.5C40.6 105.6 37.1 119.7 35.4 137.3H77.6" +
      "C77.6 121.4 72.3 109.1 73.2 96.8C75.8 86.2 82 75.7 77.6 64.2C74.1 52.8 65.3 40.5 63.5 24.6" +
      "C62.6 17.6 63.5 12.3 63.5 5.3Q54.7 7.9 45.9 5.3Z",
    body:
      "M49.4 20.2C38.9 18.5 31.8 26.4 30.1 38.7C28.3 52.8 29.2 68.6 30.1 77.4C31 87.1 38 91.5 47.7 93.3" +
      "C60 95.9 72.3 101.2 81.1 105.6C88.2 109.1 95.2 115.3 101.4 117C106.6 117.9 108.4 113.5 104.9 110" +
      "C99.6 103.8 93.4 97.7 87.3 94.2C75.8 87.1 65.3 81 57.4 73.9C56.5 63.4 60.9 52.8 60.9 40.5" +
      "C60.9 29.9 57.4 22 49.4 20.2Z",
    detail:
      "M45.9 5.3Q54.7 2.6 63.5 5.3M57.4 73.9Q53 71.3 51.2 67.8M89.9 97.7C94.3 98.6 98.7 102.1 99.6 106.5M81.1 105.6" +
      "Q86.4 100.3 87.3 94.2",
  },
  hand: {
    body:
      "M39.8 4.4C41.5 19.4 45 31.7 46.8 43.1C45 50.2 39.8 53.7 36.2 60.7C31 69.5 27.4 76.6 25.7 83.6" +
      "C24.8 89.8 31.8 91.5 34.5 86.2C38 80.1 40.6 77.4 44.2 74.8C43.3 81 43.3 86.2 43.3 91.5L43.3 109.1" +
      "C43.3 116.2 52.1 116.2 52.1 109.1L52.5 92.4L53 115.3C53 122.3 61.3 122.3 61.3 115.3L61.8 92.4L62.2 111.8" +
      "C62.6 118.8 70.6 117.9 70.1 110.9L70.1 90.6L71 102.1C71.4 108.2 78.5 107.4 78.5 101.2" +
      "C79.4 91.5 80.2 82.7 79.4 74.8C78.5 62.5 75 53.7 73.2 43.1C75 31.7 78.5 19.4 80.2 4.4Q60 7.9 39.8 4.4Z",
    detail:
      "M39.8 4.4Q60 0.9 80.2 4.4M69.7 38.7Q73.2 41.4 70.6 45.8M45.9 80.1Q48.6 77.4 51.2 80.1M54.7 78.3" +
      "Q57.4 75.7 60 78.3M63.5 79.2Q66.2 76.6 68.8 79.2M72.3 81.8Q74.1 79.2 76.7 81",
  },
};

export interface TapeRun {
  on: FigureName;
  /** The tape where it is seen. */
  tape: string;
  /** The tape where it goes round behind. */
  behind?: string;
  /** A level or a bone that the run is set by: dashed. */
  guide?: string;
  /** Where the tape is held: dots at both ends of a length. */
  ends?: [number, number][];
}

export const tapeRuns: Record<MeasureKey, TapeRun> = {
  shoulderLength: {
    on: "front",
    tape: "M44 22L28 29",
    ends: [
      [44, 22],
      [28, 29],
    ],
  },
  armscyeGirth: {
    on: "arm",
    tape: "M54.7 22C45.9 31.7 45 44 53 54.6",
    behind: "M54.7 22C62.6 31.7 61.8 45.8 53 54.6",
  },
  armscyeFront: {
    on: "front",
    tape: "M28 29C32 38 35 47 31 58",
    ends: [
      [28, 29],
      [31, 58],
    ],
  },
  armscyeBack: {
    on: "back",
    tape: "M92 29C88 38 85 47 89 58",
    ends: [
      [92, 29],
      [89, 58],
    ],
  },
  upperArmGirth: {
    on: "arm",
    tape: "M53.8 60.7Q65.3 68.6 76.7 59.8",
    behind: "M53.8 60.7Q65.3 53.7 76.7 59.8",
  },
  elbowGirth: {
    on: "bent",
    tape: "M31 83.6C40.6 86.2 51.2 82.7 57.4 74.8",
    behind: "M31 83.6C37.1 75.7 47.7 71.3 57.4 74.8",
  },
  wristGirth: { on: "hand", tape: "M46.4 43.1Q60 50.2 73.6 43.1", behind: "M46.4 43.1Q60 37 73.6 43.1" },
  handGirth: { on: "hand", tape: "M43.3 76.6Q60.9 86.2 79.4 74.8", behind: "M43.3 76.6Q60.9 69.5 79.4 74.8" },
  upperArmLength: {
    on: "bent",
    tape: "M46.8 20.2C38 21.1 31.8 27.3 30.1 38.7C28.3 52.8 29.2 68.6 30.1 80.1",
    ends: [
      [46.8, 20.2],
      [30.1, 80.1],
    ],
  },
  armLength: {
    on: "bent",
    tape: "M46.8 20.2C38 21.1 31.8 27.3 30.1 38.7C28.3 52.8 29.2 68.6 30.1 77.4C31 87.1 38 91.5 47.7 93.3C60 95.9 72.3 101.2 81.1 105.6",
    ends: [
      [46.8, 20.2],
      [81.1, 105.6],
    ],
  },
  scyeDepth: {
    on: "back",
    tape: "M60 16V58",
    guide: "M31 58H89",
    ends: [
      [60, 16],
      [60, 58],
    ],
  },
  backWidth: {
    on: "back",
    tape: "M33.500 44H86.500",
    ends: [
      [33.5, 44],
      [86.5, 44],
    ],
  },
  bustGirth: { on: "front", tape: "M31 58C44 66 76 66 89 58", behind: "M31 58C44 51 76 51 89 58" },
  cervicalToWaist: {
    on: "back",
    tape: "M60 16V87",
    guide: "M40 87H80",
    ends: [
      [60, 16],
      [60, 87],
    ],
  },
};
