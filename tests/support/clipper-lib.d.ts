/** The part of clipper-lib that the tests use; it ships without types. */
declare module "clipper-lib" {
  interface IntPoint {
    X: number;
    Y: number;
  }
  type Path = IntPoint[];
  type Paths = Path[];
  class Clipper {
    AddPath(path: Path, kind: number, closed: boolean): boolean;
    AddPaths(paths: Paths, kind: number, closed: boolean): boolean;
    Execute(clip: number, solution: Paths, subjectFill: number, clipFill: number): boolean;
    static Area(path: Path): number;
  }
  class ClipperOffset {
    constructor(miterLimit?: number, arcTolerance?: number);
    AddPath(path: Path, join: number, end: number): void;
    AddPaths(paths: Paths, join: number, end: number): void;
    Execute(solution: Paths, delta: number): void;
  }
  const PolyType: { ptSubject: number; ptClip: number };
  const PolyFillType: { pftEvenOdd: number; pftNonZero: number };
  const ClipType: { ctIntersection: number; ctUnion: number; ctDifference: number; ctXor: number };
  const JoinType: { jtSquare: number; jtRound: number; jtMiter: number };
  const EndType: { etClosedPolygon: number };
  const lib: {
    Clipper: typeof Clipper;
    ClipperOffset: typeof ClipperOffset;
    PolyType: typeof PolyType;
    PolyFillType: typeof PolyFillType;
    ClipType: typeof ClipType;
    JoinType: typeof JoinType;
    EndType: typeof EndType;
  };
  export default lib;
}
