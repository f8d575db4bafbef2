import { readdirSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Box } from '@/lib/geometry/contour';
import { flattenContour } from '@/lib/geometry/flatten';
import { pointsBox } from '@/lib/geometry/measure';
import { parseSvgPath } from '@/lib/geometry/svg-path';
import { importSvg, type SvgImport } from '@/lib/import/svg/import-svg';
import { outline as outlineSchema } from '@/lib/job/shape-schema';

const page = (attributes: string, inside: string): string =>
  `<svg xmlns="http://www.w3.org/2000/svg" xmlns:xlink="http://www.w3.org/1999/xlink" ${attributes}>\n${inside}\n</svg>`;

function read(text: string): SvgImport {
  const result = importSvg(text);
  if (!result.ok) throw new Error(`${result.error.line}: ${result.error.message}`);
  return result.value;
}

function refusal(text: string): string {
  const result = importSvg(text);
  return result.ok ? 'taken' : `${result.error.line}: ${result.error.message}`;
}

/** Boxes of the outlines, mm, before they are moved to the corner: relative to the first one's lower left. */
function boxes(text: string): Box[] {
  return read(text).outlines.map(({ shape }) => {
    if (shape.type !== 'path') throw new Error('not a path');
    const parsed = parseSvgPath(shape.d);
    if (!parsed.ok) throw new Error(parsed.error.message);
    return pointsBox(parsed.value.flatMap((contour) => flattenContour(contour, 0.0005).points));
  });
}

const size = (text: string): [number, number] => {
  const { width, height } = read(text).size;
  return [Number(width.toFixed(3)), Number(height.toFixed(3))];
};

describe('how large a drawing is', () => {
  // CSS Values and Units 4, 6.2: 1 in = 96 px = 2.54 cm; SVG 2, 8.2: viewBox to viewport.
  it.each<[string, string, [number, number]]>([
    ['mm with a viewBox', 'width="60mm" height="40mm" viewBox="0 0 120 80"', [50, 20]],
    ['inches', 'width="1in" height="1in" viewBox="0 0 100 100"', [25.4, 10.16]],
    ['centimetres', 'width="10cm" height="10cm" viewBox="0 0 100 100"', [100, 40]],
    ['points', 'width="72pt" height="72pt" viewBox="0 0 100 100"', [25.4, 10.16]],
    ['pixels', 'width="100" height="100" viewBox="0 0 100 100"', [26.458, 10.583]],
    ['no size: the viewBox in pixels', 'viewBox="0 0 100 100"', [26.458, 10.583]],
    ['no size and no viewBox', '', [26.458, 10.583]],
    ['one size alone', 'width="200mm" viewBox="0 0 100 50"', [200, 80]],
    ['percent', 'width="100%" height="100%" viewBox="0 0 100 100"', [26.458, 10.583]],
    [
      'another shape of page: meet, in the middle',
      'width="200mm" height="100mm" viewBox="0 0 100 100"',
      [100, 40],
    ],
    [
      'another shape of page: slice',
      'width="200mm" height="100mm" viewBox="0 0 100 100" preserveAspectRatio="xMidYMid slice"',
      [200, 80],
    ],
    [
      'another shape of page: none',
      'width="200mm" height="100mm" viewBox="0 0 100 100" preserveAspectRatio="none"',
      [200, 40],
    ],
  ])('%s', (_what, attributes, expected) => {
    expect(size(page(attributes, '<rect x="0" y="10" width="100" height="40"/>'))).toEqual(expected);
  });

  it('puts y up, the lower left corner where it is wanted, and scales about it', () => {
    const text = page(
      'width="100mm" height="100mm" viewBox="0 0 100 100"',
      '<rect x="10" y="20" width="30" height="5"/><rect x="10" y="60" width="30" height="5"/>',
    );
    const placed = importSvg(text, { scale: 2, at: { x: 7, y: 9 } });
    if (!placed.ok) throw new Error(placed.error.message);
    expect(placed.value.outlines.map(({ shape }) => 'd' in shape && shape.d)).toEqual([
      'M7 99 L67 99 L67 89 L7 89 Z',
      'M7 19 L67 19 L67 9 L7 9 Z',
    ]);
  });
});

describe('transforms (SVG 2, 8.5)', () => {
  const mm = 'width="100mm" height="100mm" viewBox="0 0 100 100"';
  it.each<[string, [number, number]]>([
    ['translate(5)', [20, 10]],
    ['scale(2)', [40, 20]],
    ['scale(2, 3)', [40, 30]],
    ['rotate(90)', [10, 20]],
    ['rotate(90 50 50)', [10, 20]],
    ['skewX(45)', [30, 10]],
    ['skewY(45)', [20, 30]],
    ['matrix(0 1 -1 0 30 30)', [10, 20]],
    ['translate(1,2) rotate(90),scale(.5)', [5, 10]],
  ])('%s', (transform, expected) => {
    expect(size(page(mm, `<g transform="${transform}"><rect width="20" height="10"/></g>`))).toEqual(
      expected,
    );
  });

  it('nest as groups nest', () => {
    const nested = page(
      mm,
      '<g transform="translate(10 0)"><g transform="scale(2)"><rect x="1" width="20" height="10"/></g></g><rect width="1" height="1"/>',
    );
    expect(boxes(nested)[0]).toMatchObject({ minX: 12, maxX: 52 });
  });

  it('keep a circle’s arcs exact where they keep its shape', () => {
    const { outlines } = read(
      page(mm, '<g transform="rotate(30) scale(-2 2)"><circle cx="10" cy="10" r="5"/></g>'),
    );
    const [shape] = outlines.map((outline) => outline.shape);
    const parsed = shape && 'd' in shape ? parseSvgPath(shape.d) : null;
    expect(parsed?.ok && parsed.value[0]?.segments.every(({ kind }) => kind === 'arc')).toBe(true);
  });
});

describe('reuse', () => {
  const mm = 'width="100mm" height="100mm" viewBox="0 0 100 100"';
  it('use draws what it names at its place, from defs too', () => {
    const text = page(
      mm,
      '<defs><rect id="r" width="10" height="5"/></defs><use href="#r" x="20" y="30"/><use xlink:href="#r" transform="translate(50 0)"/>',
    );
    expect(boxes(text).map(({ minX }) => minX)).toEqual([0, 30]);
  });

  it('a symbol opens a viewport of its own', () => {
    const text = page(
      mm,
      '<symbol id="s" viewBox="0 0 10 10"><rect width="10" height="10"/></symbol><use href="#s" width="40" height="40"/>',
    );
    expect(size(text)).toEqual([40, 40]);
  });

  it('a use of itself ends, and is told', () => {
    const text = page(mm, '<g id="a"><rect width="1" height="1"/><use href="#a"/></g>');
    expect(read(text).leftOut.map(({ what }) => what)).toEqual(['use: uses itself']);
  });
});

describe('style', () => {
  const mm = 'width="100mm" height="100mm" viewBox="0 0 100 100"';
  const shown = (inside: string): string[] =>
    read(page(mm, `${inside}<rect id="always" width="9" height="9"/>`)).outlines.map(({ id }) => id);
  it.each<[string, string]>([
    ['display none', '<rect id="x" display="none" width="1" height="1"/>'],
    ['by style', '<rect id="x" style="display: none" width="1" height="1"/>'],
    ['a hidden group', '<g visibility="hidden"><rect id="x" width="1" height="1"/></g>'],
    ['by class', '<style>.a, .b { display: none }</style><rect id="x" class="b" width="1" height="1"/>'],
    [
      'by id over class',
      '<style>#x { display: none } .c { display: inline }</style><rect id="x" class="c" width="1" height="1"/>',
    ],
    [
      'in CDATA',
      '<style><![CDATA[ rect.q { display:none } ]]></style><rect id="x" class="q" width="1" height="1"/>',
    ],
  ])('%s is not drawn', (_what, inside) => {
    expect(shown(inside)).toEqual(['always']);
  });

  it('keeps the fill rule, inherited and by style', () => {
    const { outlines } = read(
      page(
        mm,
        '<g style="fill-rule:evenodd"><path d="M0 0H9V9z"/><path fill-rule="nonzero" d="M0 0H9V9z"/></g>',
      ),
    );
    expect(outlines.map(({ shape }) => 'fillRule' in shape && shape.fillRule)).toEqual([
      'evenodd',
      'nonzero',
    ]);
  });
});

describe('what is left out', () => {
  it('is told with its line', () => {
    const text = page(
      'viewBox="0 0 10 10"',
      '<rect width="5" height="5"/>\n<text x="1">hello</text>\n<image href="data:,"/>\n<path d="M0 0 L1"/>',
    );
    expect(read(text).leftOut.map(({ line, what }) => `${line} ${what.slice(0, 9)}`)).toEqual(
      ['3 a text: t', '4 a picture', '5 path: its'].map((row) => row.slice(0, 11)),
    );
  });

  it('and names are kept, made unlike one another and fit for a file name', () => {
    const { outlines } = read(
      page(
        'viewBox="0 0 9 9"',
        '<rect id="Größe 1/2" width="5" height="5"/><rect aria-label="Größe 1/2" width="4" height="4"/><rect width="3" height="3"/>',
      ),
    );
    expect(outlines.map(({ id }) => id)).toEqual(['Gro-e-1-2', 'Gro-e-1-2-2', 'rect']);
    for (const outline of outlines) expect(outlineSchema.safeParse(outline).success).toBe(true);
  });
});

describe('what is refused', () => {
  it.each<[string, string, RegExp]>([
    [
      'a DOCTYPE',
      '<?xml version="1.0"?>\n<!DOCTYPE svg>\n<svg xmlns="http://www.w3.org/2000/svg"/>',
      /^2: .*DOCTYPE/,
    ],
    [
      'an entity of its own',
      '<!DOCTYPE svg [<!ENTITY a "b">]><svg xmlns="http://www.w3.org/2000/svg">&a;</svg>',
      /DOCTYPE/,
    ],
    ['an unknown entity', page('', '<text>&bomb;</text>'), /not well-formed/],
    ['a script', page('', '<script>alert(1)</script>'), /^2: .*script/],
    ['broken XML', page('', '<g><rect></g>'), /^2: .*not well-formed/],
    ['something else', '<html xmlns="http://www.w3.org/1999/xhtml"><p/></html>', /not an SVG/],
    ['no XML', 'PNG', /not well-formed/],
    ['an empty file', '', /not well-formed|not an SVG/],
    ['an empty drawing', page('', ''), /empty/],
    ['a text alone', page('', '<text>hi</text>'), /no outline/],
    ['too deep a nest', page('', '<g>'.repeat(120) + '</g>'.repeat(120)), /nested more than 100/],
    ['too large a file', ' '.repeat(10 * 1024 * 1024 + 1), /larger than 10 MB/],
  ])('%s', (_what, text, expected) => {
    expect(refusal(text)).toMatch(expected);
  });

  it('event attributes do nothing, since nothing is ever run', () => {
    expect(
      read(page('onload="alert(1)" viewBox="0 0 9 9"', '<rect onclick="x()" width="1" height="1"/>'))
        .outlines,
    ).toHaveLength(1);
  });
});

describe('files that were not made for this test', () => {
  it('from installed packages come in or say why not', () => {
    const require = createRequire(import.meta.url);
    const folder = path.dirname(require.resolve('playwright-core/package.json'));
    const files = (readdirSync(folder, { recursive: true }) as string[]).filter((file) =>
      file.endsWith('.svg'),
    );
    expect(files.length).toBeGreaterThan(3);
    let outlines = 0;
    for (const file of files) {
      const result = importSvg(readFileSync(path.join(folder, file), 'utf8'));
      if (result.ok) outlines += result.value.outlines.length;
      else expect(result.error.message).toMatch(/DOCTYPE|script|no outline/);
    }
    expect(outlines).toBeGreaterThan(files.length);
  });
});

it('never throws, whatever a file is cut or changed into', () => {
  const whole = page(
    'width="60mm" height="40mm" viewBox="0 0 120 80"',
    '<g transform="rotate(3)"><path d="M0 0 C1 2 3 4 5 6 A3 2 0 0 1 9 9z"/><use href="#a"/></g><style>.a{display:none}</style>',
  );
  fc.assert(
    fc.property(fc.nat(whole.length), fc.nat(20), fc.string({ maxLength: 12 }), (at, cut, put) => {
      const text = whole.slice(0, at) + put + whole.slice(at + cut);
      const result = importSvg(text);
      return result.ok || result.error.message.length > 5;
    }),
    { seed: 96, numRuns: 1500 },
  );
});
