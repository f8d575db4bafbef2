/** A small picture of a cut face, seen from above, row by row from the back edge, RGBA. */
export interface FacePixels {
  readonly width: number;
  readonly height: number;
  readonly rgba: Uint8ClampedArray<ArrayBuffer>;
}
