/** What the seam in `clip.ts` uses of clipper-lib, which ships without types. */
declare module 'clipper-lib' {
  namespace ClipperLib {
    interface IntPoint {
      X: number;
      Y: number;
    }
    class Clipper {
      StrictlySimple: boolean;
      AddPath(path: IntPoint[], type: number, closed: boolean): boolean;
      Execute(operation: number, solution: IntPoint[][], subjectFill: number, clipFill: number): boolean;
    }
    const PolyFillType: { pftEvenOdd: number; pftNonZero: number; pftPositive: number };
    const PolyType: { ptSubject: number; ptClip: number };
    const ClipType: { ctIntersection: number; ctUnion: number; ctDifference: number; ctXor: number };
  }
  export default ClipperLib;
}
