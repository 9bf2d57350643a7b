import { useId } from 'react';
import { FEWEST_SUBJECTS, MOST_SUBJECTS, type PracticeSettings } from '#shared/schemas/practice-settings.ts';
import { ChoiceRow } from '#src/components/choice-row.tsx';
import { Segmented } from '#src/components/segmented.tsx';
import { useToast } from '#src/components/toast.tsx';
import { problemWords } from '#src/lib/show-problem.ts';
import { useSavePracticeSettings } from '#src/queries/practice-settings.ts';

const counts = Array.from({ length: MOST_SUBJECTS - FEWEST_SUBJECTS + 1 }, (_, index) => FEWEST_SUBJECTS + index);
const options = counts.map((count) => ({ value: String(count), label: String(count) }));

/** How many subjects one set mixes. Saved when chosen. */
export function SubjectsPerSet({ settings }: { settings: PracticeSettings }) {
  const id = useId();
  const toast = useToast();
  const change = useSavePracticeSettings();
  const save = (subjectsPerSet: number, undo?: () => void) =>
    void change.mutateAsync({ subjectsPerSet }).then(
      () =>
        toast(
          `Saved. Sets opened from now on mix up to ${subjectsPerSet} subjects.`,
          undo ? { label: 'Undo', run: undo } : undefined,
        ),
      // The words stand in the row, from `change.error`.
      () => undefined,
    );
  const { subjectsPerSet } = change.isPending ? change.variables : settings;
  return (
    <ChoiceRow
      id={id}
      title="Subjects in one set"
      note={
        <p>
          Fewer subjects hold a set together; more spread it wider. In Plait’s simulation any number from{' '}
          {FEWEST_SUBJECTS} to {MOST_SUBJECTS} came to the same marks, and one subject alone to fewer.
        </p>
      }
      error={change.isError ? problemWords(change.error) : undefined}
    >
      <Segmented
        label="Subjects in one set"
        options={options}
        value={String(subjectsPerSet)}
        describedBy={`${id}-hint`}
        onChange={(value) => save(Number(value), () => save(settings.subjectsPerSet))}
      />
    </ChoiceRow>
  );
}
