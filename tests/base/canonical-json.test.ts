import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '@/lib/base/canonical-json';
import { sha256BytesHex, sha256Hex } from '@/lib/base/sha256';

describe('canonical JSON', () => {
  it('writes the example of RFC 8785, section 3.2.2', () => {
    const value = {
      numbers: [333333333.33333329, 1e30, 4.5, 2e-3, 0.000000000000000000000000001],
      string: "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\u0022/",
      literals: [null, true, false],
    };
    expect(canonicalJson(value)).toBe(
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],' +
        '"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
    );
  });

  it('sorts keys by UTF-16 code units, as RFC 8785, section 3.2.3 does', () => {
    const value = { '\u20ac': 1, '\r': 2, '\ufb33': 3, '1': 4, '\ud83d\ude00': 5, '\u0080': 6, '\u00f6': 7 };
    expect([...canonicalJson(value).matchAll(/:(\d)/g)].map((found) => found[1])).toEqual([
      '2',
      '4',
      '6',
      '7',
      '1',
      '5',
      '3',
    ]);
  });

  it('leaves out what JSON has no word for and refuses NaN', () => {
    expect(canonicalJson({ a: undefined, b: -0 })).toBe('{"b":0}');
    expect(() => canonicalJson([Number.NaN])).toThrow(TypeError);
  });
});

describe('SHA-256', () => {
  it('gives the examples of FIPS 180-4 (NIST: "abc", and the two-block message)', () => {
    expect(sha256Hex('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
    expect(sha256Hex('abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq')).toBe(
      '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
    );
  });

  it('agrees with node:crypto on any bytes and any text', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
        return sha256BytesHex(bytes) === createHash('sha256').update(bytes).digest('hex');
      }),
      { seed: 8, numRuns: 300 },
    );
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 100 }), (text) => {
        return sha256Hex(text) === createHash('sha256').update(text, 'utf8').digest('hex');
      }),
      { seed: 8, numRuns: 300 },
    );
  });
});
