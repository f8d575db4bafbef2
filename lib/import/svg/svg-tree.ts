import { SaxesParser } from 'saxes';
import { fail, ok, type Result } from '@/lib/base/result';

/** Why a drawing cannot be read: where in the file, and a sentence. */
export interface ImportProblem {
  /** 1-based. */
  readonly line: number;
  readonly column: number;
  readonly message: string;
}

/** An element of the drawing, its name without a prefix. */
export interface SvgElement {
  readonly name: string;
  readonly attributes: ReadonlyMap<string, string>;
  readonly children: readonly SvgElement[];
  /** Its own character data. */
  readonly text: string;
  readonly line: number;
}

/** 10 MB of text: a drawing larger than this is a picture or a mistake. */
export const LONGEST_DRAWING = 10 * 1024 * 1024;
const DEEPEST = 100;
const MOST_ELEMENTS = 200_000;
const SVG_NAMESPACE = 'http://www.w3.org/2000/svg';

interface Growing {
  readonly name: string;
  readonly attributes: Map<string, string>;
  readonly children: Growing[];
  text: string;
  readonly line: number;
}

/** Ends reading at the first thing that is refused. */
class Refused extends Error {
  constructor(readonly problem: ImportProblem) {
    super(problem.message);
  }
}

/**
 * Reads the elements of an SVG file. A DOCTYPE (and with it every entity of the file's own) and scripts are refused, and
 * so is what is too large, too deep or no well-formed XML; elements of other namespaces are passed over.
 */
export function readSvgTree(text: string): Result<SvgElement, ImportProblem> {
  if (text.length > LONGEST_DRAWING)
    return fail({
      line: 1,
      column: 1,
      message: 'The file is larger than 10 MB. Save it without pictures and try again.',
    });
  const parser = new SaxesParser({ xmlns: true, position: true });
  const open: Growing[] = [];
  let root: Growing | null = null;
  let foreign = 0;
  let count = 0;
  const refuse = (message: string): never => {
    throw new Refused({ line: parser.line, column: parser.column + 1, message });
  };
  parser.on('doctype', () =>
    refuse('The file has a DOCTYPE, which could hide entities. Save it as plain SVG.'),
  );
  parser.on('error', (error) => refuse(`The file is not well-formed XML: ${plainReason(error.message)}.`));
  parser.on('opentag', (tag) => {
    const isSvg = tag.uri === SVG_NAMESPACE || tag.uri === '';
    if (foreign > 0 || !isSvg) {
      foreign++;
      return;
    }
    if (tag.local === 'script') refuse('The file has a script. Save it without scripts.');
    if (open.length >= DEEPEST) refuse(`Groups are nested more than ${DEEPEST} deep.`);
    if (++count > MOST_ELEMENTS) refuse(`The file has more than ${MOST_ELEMENTS} elements.`);
    const element: Growing = {
      name: tag.local,
      attributes: new Map(
        Object.values(tag.attributes).map((one) => [attributeName(one.prefix, one.local), one.value]),
      ),
      children: [],
      text: '',
      line: parser.line,
    };
    open.at(-1)?.children.push(element);
    root ??= element;
    open.push(element);
  });
  parser.on('closetag', () => {
    if (foreign > 0) foreign--;
    else open.pop();
  });
  const addText = (data: string): void => {
    const element = open.at(-1);
    if (element && foreign === 0) element.text += data;
  };
  parser.on('text', addText);
  parser.on('cdata', addText);
  try {
    parser.write(text).close();
  } catch (error) {
    if (error instanceof Refused) return fail(error.problem);
    throw error;
  }
  const found = root as Growing | null;
  if (found?.name !== 'svg')
    return fail({ line: found?.line ?? 1, column: 1, message: 'The file is not an SVG drawing.' });
  return ok(found);
}

/** `xlink:href` and `href` are the same to us; prefixed names else keep their prefix. */
function attributeName(prefix: string, local: string): string {
  return prefix === '' || prefix === 'xlink' || prefix === 'xml' ? local : `${prefix}:${local}`;
}

/** The parser's reason without the position that it writes in front of it. */
function plainReason(message: string): string {
  return message
    .replace(/^\d+:\d+:\s*/, '')
    .replace(/[.\s]+$/, '')
    .replace(/\s+/g, ' ');
}
