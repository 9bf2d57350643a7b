import type { DraftBody } from '#shared/schemas/question.ts';
import type { QuestionKind } from '#shared/schemas/question-body.ts';
import { partLetter } from '#src/components/exam-question.tsx';
import { Tick } from '#src/components/tick.tsx';
import { tryAnswer } from './draft-marking.ts';

/** Whether Plait gives each model answer full marks. A recall card is marked by the student, so it has no such check. */
export function ModelChecks({ body, kind }: { body: DraftBody; kind: QuestionKind }) {
  if (kind === 'recallCard') return null;
  const isLettered = body.parts.length > 1;
  return (
    <ul className="mt-4 grid gap-2 text-sm">
      {body.parts.map((part, index) => {
        const name = isLettered ? `Model answer to ${partLetter(index)}` : 'Model answer';
        const verdict = tryAnswer(part, part.modelAnswer);
        if (verdict?.outcome === 'full') {
          return (
            <li key={name} className="flex items-start gap-2">
              <Tick /> {name}: full marks from Plait
            </li>
          );
        }
        if (part.answer.kind === 'selfMarked') return <li key={name}>{name}: marked by the student</li>;
        return (
          <li key={name} className="note gap">
            <b>{name} does not get full marks.</b> {verdict?.words ?? 'Its answer is not described yet.'}
          </li>
        );
      })}
    </ul>
  );
}
