import { describe, expect, it } from 'vitest';
import { clockTime, drawingLength, formatLength, lengthWithUnit } from '@/lib/job/format-length';
import { parseLength } from '@/lib/job/parse-length';

describe('lengths as people read them', () => {
  it('drop zeros that say nothing', () => {
    expect(formatLength(480, 'mm')).toBe('480');
    expect(formatLength(6.35, 'mm')).toBe('6.35');
    expect(formatLength(-0.0001, 'mm')).toBe('0');
    expect(lengthWithUnit(19.05, 'in')).toBe('0.75 in');
    expect(drawingLength(480, 'mm')).toBe('480.0');
  });

  it('can be typed again and give the same', () => {
    for (const mm of [0, 0.125, 6.35, 19.05, 123.456, -40]) {
      for (const unit of ['mm', 'in'] as const) {
        const read = parseLength(formatLength(mm, unit), unit);
        expect(read.ok && Math.abs(read.value - mm) < 0.0013).toBe(true);
      }
    }
  });

  it('give times in minutes and seconds', () => {
    expect([5, 65, 3725].map(clockTime)).toEqual(['0:05', '1:05', '1:02:05']);
  });
});
