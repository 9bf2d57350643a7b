import { Link } from 'react-router-dom';
import { type ClassQuestionDto, cannotSetWords } from '#shared/schemas/class-question.ts';
import { instantWords } from '#src/lib/dates.ts';

interface ClassChoiceNoteProps {
  row: ClassQuestionDto;
  zone: string;
}

const studentWords = (count: number): string => `${count} ${count === 1 ? 'student' : 'students'}`;

/** "Set by Ms Sorley, Tue 20 Apr, 16:55." */
function choiceWords({ choice, chosenBy, chosenAt }: ClassQuestionDto, zone: string): string | null {
  if (choice === 'asUsual' || chosenBy === null || chosenAt === null) return null;
  return `${choice === 'set' ? 'Set' : 'Kept out'} by ${chosenBy}, ${instantWords(chosenAt, zone)}.`;
}

function reachWords({ students, answeredSince, cannotSet }: ClassQuestionDto): string | null {
  if (students === 0) return cannotSet ? null : 'No student of this class is entered for it.';
  if (answeredSince === null) return studentWords(students);
  return `${answeredSince} of ${studentWords(students)} ${answeredSince === 1 ? 'has' : 'have'} answered it since.`;
}

/** Under a class's name: who chose what and when, whom it reaches, and why it cannot be set. */
export function ClassChoiceNote({ row, zone }: ClassChoiceNoteProps) {
  const { cannotSet } = row;
  return (
    <>
      <p className="num">{[choiceWords(row, zone), reachWords(row)].filter(Boolean).join(' ')}</p>
      {cannotSet ? (
        <p>
          {cannotSetWords(cannotSet)}{' '}
          {cannotSet.why === 'full' ? (
            <Link className="link" to={`/questions/${cannotSet.longest.id}`}>
              Open question {cannotSet.longest.number}
            </Link>
          ) : null}
        </p>
      ) : null}
    </>
  );
}
