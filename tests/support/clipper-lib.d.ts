/** The part of clipper-lib that the tests use; it ships without types. */
declare module "clipper-lib" {
  interface IntPoint {
    X: number;
    Y: number;
  }
  type Path = IntPoint[];
  type Paths = Path[];
  interface Clipper {
    AddPath(path: Path, kind: number, closed: boolean): boolean;
    AddPaths(paths: Paths, kind: number, closed: boolean): boolean;
    Execute(clip: number, solution: Paths, subjectFill: number, clipFill: number): boolean;
  }
  interface ClipperOffset {
    AddPath(path: Path, join: number, end: number): void;
    AddPaths(paths: Paths, join: number, end: number): void;
    Execute(solution: Paths, delta: number): void;
  }
  const lib: {
    Clipper: { new (): Clipper; Area(path: Path): number };
    ClipperOffset: new (miterLimit?: number, arcTolerance?: number) => ClipperOffset;
    PolyType: { ptSubject: number; ptClip: number };
    PolyFillType: { pftEvenOdd: number; pftNonZero: number };
    ClipType: { ctIntersection: number; ctUnion: number; ctDifference: number; ctXor: number };
    JoinType: { jtSquare: number; jtRound: number; jtMiter: number };
    EndType: { etClosedPolygon: number };
  };
  export default lib;
}
