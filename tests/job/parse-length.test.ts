import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseLength, type FieldUnit } from '@/lib/job/parse-length';

function read(text: string, unit: FieldUnit = 'mm', current?: number): number | string {
  const result = parseLength(text, unit, current);
  return result.ok ? result.value : result.error;
}

describe('figures that people type', () => {
  // The international inch is 25.4 mm exactly (international yard and pound agreement, 1959).
  it.each<[string, FieldUnit, number]>([
    ['12', 'mm', 12],
    ['12', 'in', 304.8],
    ['6,35', 'mm', 6.35],
    ['.5', 'mm', 0.5],
    ['1/4in', 'mm', 6.35],
    ['1/4 in', 'in', 6.35],
    ['1/4"', 'mm', 6.35],
    ['1 1/2"', 'mm', 38.1],
    ['1½ in', 'mm', 38.1],
    ['3/4 + 1/16 in', 'mm', 20.6375],
    ['3/4in + 2', 'mm', 21.05],
    ['2ft 6in'.replace(' ', ' + '), 'mm', 762],
    ['10 mm + 1/4"', 'in', 16.35],
    ['(120 - 2*8) / 3', 'mm', 104 / 3],
    ['2*(1/4 in + 1 mm)', 'mm', 14.7],
    ['-3', 'mm', -3],
    ['−3 cm', 'mm', -30],
    ['90°', 'deg', 90],
    ['360/8', 'deg', 45],
    ['4', 'count', 4],
  ])('%s in a field of %s', (text, unit, expected) => {
    expect(read(text, unit)).toBeCloseTo(expected, 10);
  });

  it.each<[string, number, number]>([
    ['+0.2', 6, 6.2],
    ['+-0.2', 6, 5.8],
    ['+1/8in', 6, 9.175],
    ['*2', 6, 12],
    ['/4', 6, 1.5],
  ])('%s works on %d', (text, current, expected) => {
    expect(read(text, 'mm', current)).toBeCloseTo(expected, 10);
  });

  it.each<[string, FieldUnit, RegExp]>([
    ['', 'mm', /Write a number/],
    ['1,234.5', 'mm', /write 1234\.5 without a mark between thousands/],
    ['12 parsec', 'mm', /'parsec' is not a unit of length/],
    ['12 mm', 'deg', /not a unit of angle/],
    ['3 mm', 'count', /plain number/],
    ['3 4', 'mm', /side by side/],
    ['2in*3in', 'mm', /two lengths/],
    ['1/0', 'mm', /divides by nothing/],
    ['(1+2', 'mm', /bracket is not closed/],
    ['1+', 'mm', /missing at the end/],
    ['1)', 'mm', /does not belong/],
    ['5 in mm', 'mm', /does not belong/],
    ['+2', 'mm', /no one value/],
    ['alert(1)', 'mm', /missing before 'alert'/],
    ['1e3', 'mm', /'e' is not a unit/],
  ])('refuses %s in a field of %s', (text, unit, sentence) => {
    expect(read(text, unit)).toMatch(sentence);
  });

  it('never throws and never gives what is not a finite number', () => {
    const piece = fc.constantFrom(
      '1',
      '2.5',
      ',',
      '.',
      '+',
      '-',
      '*',
      '/',
      '(',
      ')',
      'in',
      'mm',
      ' ',
      '"',
      'x',
      '½',
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 40 }), (pieces) => {
        const result = parseLength(pieces.join(''), 'mm', 3);
        return result.ok ? Number.isFinite(result.value) : result.error.length > 5;
      }),
      { seed: 20, numRuns: 2000 },
    );
  });
});
