import { describe, expect, it } from 'vitest';
import { turnCorner, turnPoint } from '@/lib/job/turn';

const board = { x: 200, y: 100 };

/** Elementary geometry: turning a sheet of width W and height H about an axis in its own plane. */
describe('turning the board over', () => {
  it('about y, like a page: (x, y) → (W − x, y)', () => {
    expect(turnPoint(board, 'y', { x: 30, y: 20 })).toEqual({ x: 170, y: 20 });
  });

  it('about x, towards you: (x, y) → (x, H − y)', () => {
    expect(turnPoint(board, 'x', { x: 30, y: 20 })).toEqual({ x: 30, y: 80 });
  });

  it('twice changes nothing; one after the other is a half turn in the plane', () => {
    for (const axis of ['x', 'y'] as const) {
      expect(turnPoint(board, axis, turnPoint(board, axis, { x: 30, y: 20 }))).toEqual({ x: 30, y: 20 });
    }
    const wrongAxis = turnPoint(board, 'x', turnPoint(board, 'y', { x: 30, y: 20 }));
    expect(wrongAxis).toEqual({ x: 170, y: 80 });
  });

  it('swaps pins that stand symmetrically, and shows the wrong turn', () => {
    const pins = [
      { x: 15, y: 20 },
      { x: 185, y: 20 },
    ];
    expect(pins.map((pin) => turnPoint(board, 'y', pin))).toEqual([pins[1], pins[0]]);
    expect(pins).not.toContainEqual(turnPoint(board, 'x', pins[0]!));
  });

  it('keeps the physical corner: front-left is back-left after x, front-right after y', () => {
    expect(turnCorner('x', 'front-left')).toBe('back-left');
    expect(turnCorner('y', 'front-left')).toBe('front-right');
    expect(turnCorner('x', 'center')).toBe('center');
  });
});
