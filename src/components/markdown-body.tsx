import './maths.css';
import ReactMarkdown, { type Components } from 'react-markdown';
import rehypeKatex from 'rehype-katex';
import rehypeSanitize, { defaultSchema } from 'rehype-sanitize';
import remarkMath from 'remark-math';
import { rehypeFormulaErrors, rehypeRefuseFormulas, remarkOneLineDisplay } from './markdown-plugins.ts';

const schema = {
  ...defaultSchema,
  protocols: { ...defaultSchema.protocols, href: ['https', 'mailto'] },
  attributes: {
    ...defaultSchema.attributes,
    code: [['className', /^language-./, 'math-inline', 'math-display'] as [string, ...(string | RegExp)[]]],
  },
};

const katexOptions = { output: 'htmlAndMathml', trust: false, strict: 'ignore', maxExpand: 200, maxSize: 20 } as const;

/** Pictures come from our own store; links lead to https, mail or our own pages. */
function allowedUrl(url: string, key: string): string {
  if (key === 'src') return /^\/media\/[0-9a-f-]{36}$/.test(url) ? url : '';
  return /^(https:|mailto:|\/(?!\/)|#)/.test(url) ? url : '';
}

const blockParts: Components = {
  p: ({ children }) => <p className="[&:not(:first-child)]:mt-2">{children}</p>,
  ul: ({ children }) => <ul className="list-disc pl-6 my-1">{children}</ul>,
  ol: ({ children }) => <ol className="list-decimal pl-6 my-1">{children}</ol>,
  a: ({ children, href }) => (
    <a className="link" href={href}>
      {children}
    </a>
  ),
};
const inlineParts: Components = { ...blockParts, p: ({ children }) => children };

/**
 * The one place where Markdown becomes elements, for preview and display alike. Raw HTML is never read;
 * the sanitiser runs before KaTeX, so that no author reaches a style attribute.
 */
export function MarkdownBody({ source, isInline }: { source: string; isInline: boolean }) {
  return (
    <ReactMarkdown
      remarkPlugins={[remarkMath, remarkOneLineDisplay]}
      rehypePlugins={[[rehypeSanitize, schema], rehypeRefuseFormulas, [rehypeKatex, katexOptions], rehypeFormulaErrors]}
      urlTransform={allowedUrl}
      components={isInline ? inlineParts : blockParts}
    >
      {source}
    </ReactMarkdown>
  );
}
