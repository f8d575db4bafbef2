import type { SvgElement } from './svg-tree';

/** What of an element's style decides which outline it becomes. */
export interface SvgStyle {
  readonly display: string;
  readonly visibility: string;
  readonly fillRule: string;
}

export const INITIAL_STYLE: SvgStyle = { display: 'inline', visibility: 'visible', fillRule: 'nonzero' };

interface Rule {
  /** Parts of the last compound selector; rules with combinators match by it alone, which never hides too little. */
  readonly name: string | null;
  readonly id: string | null;
  readonly classes: readonly string[];
  readonly declarations: ReadonlyMap<string, string>;
  readonly weight: number;
}

export type StyleSheet = readonly Rule[];

const PROPERTIES = new Set(['display', 'visibility', 'fill-rule']);
const SIMPLE = /^(\*|[A-Za-z][\w-]*)?((?:[.#][A-Za-z_-][\w-]*)*)$/;

/** Rules of `<style>` elements that touch what we look at. Selectors are names, classes and ids, also in lists. */
export function readStyleSheet(texts: readonly string[]): StyleSheet {
  const plain = texts.join('\n').replace(/\/\*[\s\S]*?\*\//g, '');
  const rules: Rule[] = [];
  for (const found of plain.matchAll(/([^{}]+)\{([^{}]*)\}/g)) {
    const declarations = readDeclarations(found[2] ?? '');
    if (declarations.size === 0) continue;
    for (const selector of (found[1] ?? '').split(',')) {
      const rule = readSelector(selector.trim(), declarations);
      if (rule) rules.push(rule);
    }
  }
  // Stable: of equal weight the later one wins.
  return rules.sort((a, b) => a.weight - b.weight);
}

function readSelector(selector: string, declarations: ReadonlyMap<string, string>): Rule | null {
  // A selector with a combinator or a state would need the whole tree; guessing could hide what is meant to be cut.
  const found = SIMPLE.exec(selector);
  if (!found || selector === '') return null;
  const marks = found[2]?.match(/[.#][\w-]+/g) ?? [];
  const ids = marks.filter((mark) => mark.startsWith('#'));
  const classes = marks.filter((mark) => mark.startsWith('.')).map((mark) => mark.slice(1));
  const name = found[1] === undefined || found[1] === '*' ? null : found[1];
  return {
    name,
    id: ids[0]?.slice(1) ?? null,
    classes,
    declarations,
    weight: ids.length * 10_000 + classes.length * 100 + (name ? 1 : 0),
  };
}

function readDeclarations(text: string): Map<string, string> {
  const declarations = new Map<string, string>();
  for (const part of text.split(';')) {
    const colon = part.indexOf(':');
    if (colon < 0) continue;
    const property = part.slice(0, colon).trim().toLowerCase();
    const value = part
      .slice(colon + 1)
      .replace(/!important/i, '')
      .trim()
      .toLowerCase();
    if (PROPERTIES.has(property)) declarations.set(property, value);
  }
  return declarations;
}

/** The style of an element: attributes, then the sheet's rules, then its own `style`; the rest is inherited. */
export function styleOf(element: SvgElement, sheet: StyleSheet, parent: SvgStyle): SvgStyle {
  const own = new Map<string, string>();
  for (const property of PROPERTIES) {
    const value = element.attributes.get(property)?.trim().toLowerCase();
    if (value !== undefined) own.set(property, value);
  }
  const classes = (element.attributes.get('class') ?? '').split(/\s+/);
  const id = element.attributes.get('id') ?? null;
  for (const rule of sheet) {
    const matches =
      (rule.name === null || rule.name === element.name) &&
      (rule.id === null || rule.id === id) &&
      rule.classes.every((one) => classes.includes(one));
    if (matches) for (const [property, value] of rule.declarations) own.set(property, value);
  }
  for (const [property, value] of readDeclarations(element.attributes.get('style') ?? ''))
    own.set(property, value);
  const inherited = (property: string, before: string): string => {
    const value = own.get(property);
    return value === undefined || value === 'inherit' ? before : value;
  };
  return {
    display: own.get('display') ?? 'inline',
    visibility: inherited('visibility', parent.visibility),
    fillRule: inherited('fill-rule', parent.fillRule),
  };
}
