import { Select } from './field.tsx';
import { Segmented } from './segmented.tsx';

interface SubjectChoiceProps {
  subjects: readonly { id: string; name: string }[];
  value: string;
  onChange: (id: string) => void;
}

/** Most subjects that fit side by side; more become a list to choose from. */
const MOST_IN_SIGHT = 3;

/** Whose questions a page shows, where a person has several subjects. */
export function SubjectChoice({ subjects, value, onChange }: SubjectChoiceProps) {
  if (subjects.length < 2) return null;
  if (subjects.length <= MOST_IN_SIGHT) {
    const options = subjects.map(({ id, name }) => ({ value: id, label: name }));
    return <Segmented label="Subject" options={options} value={value} onChange={onChange} />;
  }
  return (
    <Select
      isSmall
      isLabelHidden
      label="Subject"
      frameClass="w-56 max-w-full"
      value={value}
      onChange={(event) => onChange(event.target.value)}
    >
      {subjects.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </Select>
  );
}
