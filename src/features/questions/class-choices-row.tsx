import { useId } from 'react';
import {
  type ChooseForClass,
  type ClassChoice,
  type ClassQuestionDto,
  classChoiceSchema,
  classChoiceWords,
} from '#shared/schemas/class-question.ts';
import type { QuestionDto } from '#shared/schemas/question.ts';
import { ChoiceRow } from '#src/components/choice-row.tsx';
import { Segmented } from '#src/components/segmented.tsx';
import { useToast } from '#src/components/toast.tsx';
import { problemWords } from '#src/lib/show-problem.ts';
import { useChooseForClass } from '#src/queries/class-questions.ts';
import { ClassChoiceNote } from './class-choices-note.tsx';

interface ClassChoiceRowProps {
  question: Pick<QuestionDto, 'id' | 'number'>;
  row: ClassQuestionDto;
  zone: string;
}

const savedWords = (choice: ClassChoice, number: number, className: string): string =>
  ({
    asUsual: `Saved. Question ${number} comes as usual for ${className}.`,
    set: `Saved. Question ${number} goes into the next sets of ${className}.`,
    excluded: `Saved. Question ${number} stays out of the sets of ${className}.`,
  })[choice];

/** What brings a row back to how it is: whoever has answered since it was set is not asked anew. */
const backTo = ({ choice, chosenAt }: ClassQuestionDto): ChooseForClass =>
  choice === 'set' ? { choice, ...(chosenAt ? { since: chosenAt } : {}) } : { choice };

/** One class and what it gets of the question. Saved when chosen. */
export function ClassChoiceRow({ question, row, zone }: ClassChoiceRowProps) {
  const id = useId();
  const toast = useToast();
  const change = useChooseForClass(question.id, row.classId);
  const save = (wish: ChooseForClass, undo?: () => void) =>
    void change.mutateAsync(wish).then(
      () =>
        toast(savedWords(wish.choice, question.number, row.className), undo ? { label: 'Undo', run: undo } : undefined),
      // The words stand in the row, from `change.error`.
      () => undefined,
    );
  const options = classChoiceSchema.options.map((value) => ({
    value,
    label: classChoiceWords[value],
    isDisabled: !row.can.choose || (value === 'set' && row.cannotSet !== null && row.choice !== 'set'),
  }));
  return (
    <ChoiceRow
      id={id}
      title={row.className}
      note={<ClassChoiceNote row={row} zone={zone} />}
      error={change.isError ? problemWords(change.error) : undefined}
    >
      <Segmented
        label={`Question ${question.number} in the sets of ${row.className}`}
        options={options}
        // While it is being saved the choice shows already, and goes back where that fails.
        value={change.isPending ? change.variables.choice : row.choice}
        describedBy={`${id}-hint`}
        onChange={(choice) => save({ choice }, () => save(backTo(row)))}
      />
    </ChoiceRow>
  );
}
