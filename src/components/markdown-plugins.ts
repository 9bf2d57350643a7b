import type { ElementContent, Root, RootContent } from 'hast';
import type { Root as MarkdownRoot } from 'mdast';
import type { VFile } from 'vfile';
import { refuseFormula } from '#src/lib/maths-commands.ts';

type Node = Root | RootContent | ElementContent;

const classesOf = (node: Node): string[] => {
  const names = node.type === 'element' ? node.properties.className : undefined;
  return Array.isArray(names) ? names.map(String) : [];
};

const textOf = (node: Node): string => {
  if (node.type === 'text') return node.value;
  return 'children' in node ? node.children.map(textOf).join('') : '';
};

/** The formula as its author typed it, marked as not drawn, with the reason. */
const errorBox = (source: string, reason: string): ElementContent => ({
  type: 'element',
  tagName: 'span',
  properties: { className: ['formula-error'] },
  children: [
    { type: 'element', tagName: 'code', properties: {}, children: [{ type: 'text', value: source }] },
    {
      type: 'element',
      tagName: 'span',
      properties: { className: ['formula-reason'] },
      children: [{ type: 'text', value: ` ${reason}` }],
    },
  ],
});

function replaceWhere(node: Node, replace: (child: Node) => ElementContent | null): void {
  if (!('children' in node)) return;
  node.children.forEach((child, index) => {
    const other = replace(child);
    if (other) node.children[index] = other;
    else replaceWhere(child, replace);
  });
}

/**
 * Makes `$$…$$` a display formula also where it stands on one line of its own, and draws it at full size where it
 * stands among words, as in the lists, which have a question on one line.
 */
export const remarkOneLineDisplay = () => (tree: MarkdownRoot, file: VFile) => {
  const source = String(file);
  for (const block of tree.children) {
    if (block.type !== 'paragraph') continue;
    for (const node of block.children) {
      const start = node.position?.start.offset;
      if (String(node.type) !== 'inlineMath' || start === undefined || !source.startsWith('$$', start)) continue;
      if (block.children.length === 1) {
        node.data = { ...node.data, hProperties: { className: ['language-math', 'math-display'] } };
      } else if ('value' in node) {
        node.data = { ...node.data, hChildren: [{ type: 'text', value: `\\displaystyle ${node.value}` }] };
      }
    }
  }
};

/** Runs before KaTeX: takes out every formula with a command off the allow-list. */
export const rehypeRefuseFormulas = () => (tree: Root) =>
  replaceWhere(tree, (node) => {
    const classes = classesOf(node);
    if (!classes.includes('math-inline') && !classes.includes('math-display')) return null;
    const source = textOf(node);
    const reason = refuseFormula(source);
    return reason ? errorBox(source, reason) : null;
  });

/** Runs after KaTeX: shows what could not be read in our own box, in place of KaTeX's. */
export const rehypeFormulaErrors = () => (tree: Root) =>
  replaceWhere(tree, (node) =>
    classesOf(node).includes('katex-error') ? errorBox(textOf(node), 'This formula cannot be read.') : null,
  );
