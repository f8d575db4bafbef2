import { IDENTITY, multiply, type Matrix } from '@/lib/geometry/transform';
import { DEGREES } from '@/lib/geometry/vec';

const CALL = /\s*,?\s*(matrix|translate|scale|rotate|skewX|skewY)\s*\(([^)]*)\)/y;
const NUMBER = /[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/g;

/** The matrix of a `transform` attribute (SVG 2, section 8.5; CSS Transforms 1), or null where it cannot be read. */
export function readTransform(text: string | undefined): Matrix | null {
  if (text === undefined || text.trim() === '' || text.trim() === 'none') return IDENTITY;
  let matrix = IDENTITY;
  let at = 0;
  while (text.slice(at).trim() !== '') {
    CALL.lastIndex = at;
    const call = CALL.exec(text);
    if (!call) return null;
    const values = (call[2]?.match(NUMBER) ?? []).map(Number);
    const one = callMatrix(call[1] ?? '', values);
    if (!one) return null;
    matrix = multiply(matrix, one);
    at = CALL.lastIndex;
  }
  return matrix.every(Number.isFinite) ? matrix : null;
}

function callMatrix(name: string, values: readonly number[]): Matrix | null {
  const [a = 0, b, c] = values;
  switch (name) {
    case 'matrix':
      return values.length === 6 ? (values as unknown as Matrix) : null;
    case 'translate':
      return [1, 0, 0, 1, a, b ?? 0];
    case 'scale':
      return values.length === 0 ? null : [a, 0, 0, b ?? a, 0, 0];
    case 'skewX':
      return [1, 0, Math.tan(a * DEGREES), 1, 0, 0];
    case 'skewY':
      return [1, Math.tan(a * DEGREES), 0, 1, 0, 0];
    default: {
      const turn: Matrix = [
        Math.cos(a * DEGREES),
        Math.sin(a * DEGREES),
        -Math.sin(a * DEGREES),
        Math.cos(a * DEGREES),
        0,
        0,
      ];
      if (b === undefined) return turn;
      return multiply([1, 0, 0, 1, b, c ?? 0], multiply(turn, [1, 0, 0, 1, -b, -(c ?? 0)]));
    }
  }
}
