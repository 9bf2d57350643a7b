export type MarkdownAct = 'bold' | 'italic' | 'list' | 'maths' | 'superscript' | 'subscript';

interface Edit {
  /** The stretch to replace, and what replaces it. */
  from: number;
  to: number;
  text: string;
  /** The selection afterwards. */
  selectFrom: number;
  selectTo: number;
}

/** True where a place in Markdown lies between two dollar signs. */
function isInMaths(source: string, at: number): boolean {
  const before = source.slice(0, at).replaceAll('\\$', '');
  return (before.match(/\$/g)?.length ?? 0) % 2 === 1;
}

function wrap(source: string, from: number, to: number, open: string, close: string): Edit {
  const inner = source.slice(from, to);
  const start = from + open.length;
  return { from, to, text: `${open}${inner}${close}`, selectFrom: start, selectTo: start + inner.length };
}

function listLines(source: string, from: number, to: number): Edit {
  const start = source.lastIndexOf('\n', from - 1) + 1;
  const found = source.indexOf('\n', to);
  const end = found === -1 ? source.length : found;
  const lines = source.slice(start, end).split('\n');
  const isList = lines.every((line) => line.startsWith('- '));
  const text = lines.map((line) => (isList ? line.slice(2) : `- ${line}`)).join('\n');
  return { from: start, to: end, text, selectFrom: start + text.length, selectTo: start + text.length };
}

/** What a toolbar button does to Markdown with a selection. */
export function editMarkdown(act: MarkdownAct, source: string, from: number, to: number): Edit {
  switch (act) {
    case 'bold':
      return wrap(source, from, to, '**', '**');
    case 'italic':
      return wrap(source, from, to, '*', '*');
    case 'maths':
      return wrap(source, from, to, '$', '$');
    case 'list':
      return listLines(source, from, to);
    case 'superscript':
    case 'subscript': {
      const sign = act === 'superscript' ? '^' : '_';
      return isInMaths(source, from)
        ? wrap(source, from, to, `${sign}{`, '}')
        : wrap(source, from, to, `$${sign}{`, '}$');
    }
  }
}
