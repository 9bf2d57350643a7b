import { type QuestionDto, versionStatusWords } from '#shared/schemas/question.ts';
import { instantWords } from '#src/lib/dates.ts';

interface VersionListProps {
  question: QuestionDto;
  zone: string;
}

/** Every version, newest first, with who wrote it. */
export function VersionList({ question, zone }: VersionListProps) {
  const { versions } = question;
  if (versions.length === 0) return null;
  return (
    <section aria-labelledby="versions" className="mt-6 border-t border-rule pt-3">
      <h2 id="versions" className="!text-[1.125rem] !leading-6">
        Versions
      </h2>
      <ul className="mt-1 text-sm">
        {[...versions]
          .sort((a, b) => b.version - a.version)
          .map((version) => (
            <li
              key={version.id}
              className="grid grid-cols-[1.5rem_minmax(0,1fr)_auto] gap-x-2 border-b border-rule-soft py-2"
            >
              <span className="num font-bold">{version.version}</span>
              <span>{versionStatusWords[version.status]}</span>
              <span className="num text-ink-2">{instantWords(version.at, zone)}</span>
              <span className="col-start-2 col-end-4 text-ink-2 [overflow-wrap:anywhere]">{version.author}</span>
            </li>
          ))}
      </ul>
    </section>
  );
}
