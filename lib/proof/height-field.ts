/**
 * A grid of surface heights, one at the centre of each cell, row by row. Heights are z against the face being cut, mm:
 * 0 on the face, negative below. Cell (column, row) has its centre at origin + (index + ½)·step.
 */
export interface HeightField {
  readonly x: number;
  readonly y: number;
  readonly stepX: number;
  readonly stepY: number;
  readonly columns: number;
  readonly rows: number;
  readonly z: Float32Array;
}

/** An untouched field over a rectangle whose cells divide it evenly and are at most `step` wide and `stepY` deep. */
export function createHeightField(
  box: { readonly x: number; readonly y: number; readonly width: number; readonly height: number },
  step: number,
  stepY = step,
): HeightField {
  const columns = Math.max(1, Math.ceil(box.width / step - 1e-9));
  const rows = Math.max(1, Math.ceil(box.height / stepY - 1e-9));
  return {
    x: box.x,
    y: box.y,
    stepX: box.width / columns,
    stepY: box.height / rows,
    columns,
    rows,
    z: new Float32Array(columns * rows),
  };
}

/** Index of the cell that holds a place; places beyond the field count to its nearest cell. */
export function cellAt({ x, y, stepX, stepY, columns, rows }: HeightField, atX: number, atY: number): number {
  const column = Math.min(columns - 1, Math.max(0, Math.floor((atX - x) / stepX)));
  const row = Math.min(rows - 1, Math.max(0, Math.floor((atY - y) / stepY)));
  return row * columns + column;
}

/** Centre of a cell. */
export function cellCentre(field: HeightField, cell: number): { x: number; y: number } {
  const column = cell % field.columns;
  const row = (cell - column) / field.columns;
  return { x: field.x + (column + 0.5) * field.stepX, y: field.y + (row + 0.5) * field.stepY };
}
