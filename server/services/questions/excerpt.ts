/** About as many characters of Markdown as a row of a list has room for. */
const LENGTH = 160;

// Formulas, escaped characters, words and spaces: none of them is cut in two.
const ATOMS = /\$\$[\s\S]*?\$\$|\$(?:\\.|[^$\\])+\$|\\.|[^\s$\\]+|\s+|[\s\S]/g;

const isTable = (block: string) => /^\s*(?:\||```|!\[)/.test(block);

/** The opening words as one line of Markdown: blocks run on, tables, listings and pictures left out. */
function openingLine(markdown: string): string {
  const blocks = markdown.split(/\n\s*\n/).filter((block) => block.trim() !== '');
  const words = blocks.filter((block) => !isTable(block));
  return (words.length > 0 ? words : blocks)
    .map((block) => block.replace(/^\s{0,3}(?:#{1,6}\s+|>\s?)/, ''))
    .join(' ')
    .replace(/\s+/g, ' ')
    .trim();
}

/** The first 160 characters or so, Markdown kept, never cut inside a formula: one long formula comes whole. */
export function excerptOf(markdown: string): string {
  const line = openingLine(markdown);
  if (line.length <= LENGTH) return line;
  let kept = '';
  for (const [atom] of line.matchAll(ATOMS)) {
    if (kept === '' && atom.length > LENGTH && !atom.startsWith('$')) return `${atom.slice(0, LENGTH)}…`;
    if (kept !== '' && kept.length + atom.length > LENGTH) break;
    kept += atom;
  }
  return `${kept.trimEnd()}…`;
}
