/** Letters that have a plain form of their own; all else outside ASCII becomes a blank. */
const PLAIN: Readonly<Record<string, string>> = {
  ß: 'ss',
  æ: 'ae',
  ø: 'o',
  œ: 'oe',
  ł: 'l',
  đ: 'd',
  '×': 'x',
  '°': 'deg',
};

/**
 * Comment lines that say `word: text`. ASCII only, without parentheses and without `? ! ~ $ %`, which some controllers
 * act on wherever they stand; never longer than `longest`, brackets included. The fixed word comes first, so that
 * nobody's text can be taken for an active comment.
 */
export function commentLines(word: string, text: string, longest: number, capitals: boolean): string[] {
  const plain = ascii(`${word}: ${text}`);
  const said = capitals ? plain.toUpperCase() : plain;
  const room = longest - 2;
  const lines: string[] = [];
  let line = '';
  for (const piece of said.split(' ').flatMap((one) => slices(one, room - word.length - 2))) {
    const next = line === '' ? piece : `${line} ${piece}`;
    if (next.length > room && line !== '') {
      lines.push(line);
      line = `${capitals ? word.toUpperCase() : word}: ${piece}`;
    } else line = next;
  }
  return [...lines, line].map((one) => `(${one})`);
}

/** The text in plain characters that no controller acts on. */
function ascii(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[ßæøœłđ×°]/gi, (letter) => PLAIN[letter.toLowerCase()] ?? ' ')
    .replace(/[‘’‚‛]/g, "'")
    .replace(/[()[\]{}]/g, ' ')
    .replace(/[?!~$%;]/g, ' ')
    .replace(/[^ -~]/g, ' ')
    .replace(/ +/g, ' ')
    .trim();
}

function slices(text: string, size: number): string[] {
  const parts: string[] = [];
  for (let at = 0; at < text.length; at += size) parts.push(text.slice(at, at + size));
  return parts.length > 0 ? parts : [''];
}
