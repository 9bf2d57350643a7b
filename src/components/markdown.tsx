import { lazy, Suspense } from 'react';

const MarkdownBody = lazy(() => import('./markdown-body.tsx').then((module) => ({ default: module.MarkdownBody })));

interface MarkdownProps {
  /** Markdown with LaTeX between dollar signs. */
  source: string;
  /** Stands inside a line: no paragraph of its own. */
  isInline?: boolean;
  /** BCP 47 tag where the text is not in English: "fr". */
  lang?: string | undefined;
}

/** Markdown with mathematics. The code for it loads with the first one shown; until then the source stands there. */
export function Markdown({ source, isInline = false, lang }: MarkdownProps) {
  const Frame = isInline ? 'span' : 'div';
  return (
    <Frame lang={lang} className="min-w-0 [overflow-wrap:anywhere]">
      <Suspense fallback={isInline ? source : <p className="whitespace-pre-line">{source}</p>}>
        <MarkdownBody source={source} isInline={isInline} />
      </Suspense>
    </Frame>
  );
}
