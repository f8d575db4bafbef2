import type { HeightField } from './height-field';

/** A connected piece of what is left, 8 neighbours a cell, in the field's own coordinates. */
export interface Piece {
  readonly cells: number;
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
  /** A cell of the piece, in the middle of its longest run. */
  readonly cell: number;
  readonly touchesEdge: boolean;
}

interface Group {
  parent: number;
  cells: number;
  minColumn: number;
  maxColumn: number;
  minRow: number;
  maxRow: number;
  longest: number;
  cell: number;
}

/**
 * The connected pieces of the cells for which `isWood` holds, found run by run along rows. With 8 neighbours a cell two
 * pieces that touch only by a corner count as one: at the grid's fineness such a bridge may be wood.
 */
export function woodPieces(field: HeightField, isWood: (cell: number) => boolean): Piece[] {
  const groups: Group[] = [];
  let above: { from: number; to: number; group: number }[] = [];
  for (let row = 0; row < field.rows; row++) {
    const runs: { from: number; to: number; group: number }[] = [];
    let behind = 0;
    const base = row * field.columns;
    for (let column = 0; column < field.columns; column++) {
      if (!isWood(base + column)) continue;
      const from = column;
      while (column + 1 < field.columns && isWood(base + column + 1)) column++;
      const group = groups.length;
      groups.push(newGroup(group, row, from, column, field.columns));
      while (behind < above.length && above[behind]!.to < from - 1) behind++;
      for (let k = behind; k < above.length && above[k]!.from <= column + 1; k++)
        join(groups, above[k]!.group, group);
      runs.push({ from, to: column, group });
    }
    above = runs;
  }
  return groups.filter((group, i) => group.parent === i).map((group) => pieceOf(field, group));
}

function newGroup(index: number, row: number, from: number, to: number, columns: number): Group {
  return {
    parent: index,
    cells: to - from + 1,
    minColumn: from,
    maxColumn: to,
    minRow: row,
    maxRow: row,
    longest: to - from + 1,
    cell: row * columns + ((from + to) >> 1),
  };
}

function rootOf(groups: readonly Group[], index: number): number {
  let at = index;
  while (groups[at]!.parent !== at) {
    groups[at]!.parent = groups[groups[at]!.parent]!.parent;
    at = groups[at]!.parent;
  }
  return at;
}

function join(groups: readonly Group[], a: number, b: number): void {
  const [i, k] = [rootOf(groups, a), rootOf(groups, b)];
  if (i === k) return;
  const into = groups[Math.min(i, k)]!;
  const other = groups[Math.max(i, k)]!;
  other.parent = Math.min(i, k);
  into.cells += other.cells;
  into.minColumn = Math.min(into.minColumn, other.minColumn);
  into.maxColumn = Math.max(into.maxColumn, other.maxColumn);
  into.minRow = Math.min(into.minRow, other.minRow);
  into.maxRow = Math.max(into.maxRow, other.maxRow);
  if (other.longest > into.longest) {
    into.longest = other.longest;
    into.cell = other.cell;
  }
}

function pieceOf(field: HeightField, group: Group): Piece {
  return {
    cells: group.cells,
    minX: field.x + group.minColumn * field.stepX,
    maxX: field.x + (group.maxColumn + 1) * field.stepX,
    minY: field.y + group.minRow * field.stepY,
    maxY: field.y + (group.maxRow + 1) * field.stepY,
    cell: group.cell,
    touchesEdge:
      group.minColumn === 0 ||
      group.minRow === 0 ||
      group.maxColumn === field.columns - 1 ||
      group.maxRow === field.rows - 1,
  };
}
