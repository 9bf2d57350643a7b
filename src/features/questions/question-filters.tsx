import type { TopicDto } from '#shared/schemas/curriculum.ts';
import type { QuestionPageDto } from '#shared/schemas/question.ts';
import { Select } from '#src/components/field.tsx';
import type { ListSearch } from './list-search.ts';
import { SearchBox } from './search-box.tsx';

interface QuestionFiltersProps {
  search: ListSearch;
  topics: TopicDto[];
  authors: QuestionPageDto['authors'];
  /** Typing replaces the address; a choice adds to the history. */
  onChange: (change: Partial<Record<keyof ListSearch, string | undefined>>, isTyping?: boolean) => void;
}

interface FilterProps {
  label: string;
  value: string;
  options: [string, string][];
  onChange: (value: string | undefined) => void;
  frameClass?: string;
}

function Filter({ label, value, options, onChange, frameClass = '' }: FilterProps) {
  return (
    <Select
      isSmall
      isLabelHidden
      label={label}
      frameClass={`max-sm:flex-1 max-sm:basis-[8.5rem] ${frameClass}`}
      className="!min-h-9 max-w-full !font-medium sm:!w-auto sm:max-w-[10.5rem]"
      value={value}
      onChange={(event) => onChange(event.target.value || undefined)}
    >
      {options.map(([key, words]) => (
        <option key={key} value={key}>
          {words}
        </option>
      ))}
    </Select>
  );
}

/** Search and filters of the list. Everything chosen stands in the address. */
export function QuestionFilters({ search, topics, authors, onChange }: QuestionFiltersProps) {
  return (
    <>
      <SearchBox
        label="Search wording or mark scheme"
        value={search.q}
        onSearch={(q) => onChange({ q: q || undefined }, true)}
      />
      <Filter
        label="Topic"
        frameClass="lg:hidden max-sm:basis-full"
        value={search.topic ?? ''}
        options={[
          ['', 'All topics'],
          ...topics.map(({ id, number, title }): [string, string] => [id, `${number} ${title}`]),
        ]}
        onChange={(topic) => onChange({ topic })}
      />
      <Filter
        label="Kind"
        value={search.kind ?? ''}
        options={[
          ['', 'Any kind'],
          ['shortAnswer', 'Short answer'],
          ['recallCard', 'Recall card'],
        ]}
        onChange={(kind) => onChange({ kind })}
      />
      <Filter
        label="Status"
        value={search.status ?? ''}
        options={[
          ['', 'Any status'],
          ['live', 'Live'],
          ['draft', 'Draft'],
          ['inReview', 'In review'],
          ['retired', 'Retired'],
        ]}
        onChange={(status) => onChange({ status })}
      />
      <Filter
        label="Author"
        value={search.author ?? ''}
        options={[['', 'Any author'], ...authors.map(({ id, name }): [string, string] => [id, name])]}
        onChange={(author) => onChange({ author })}
      />
      <Filter
        label="Order"
        value={search.sort === 'number' ? '' : search.sort}
        options={[
          ['', 'By number'],
          ['newest', 'Newest first'],
          ['marks', 'Most marks first'],
          ['facility', 'Hardest first'],
        ]}
        onChange={(sort) => onChange({ sort })}
      />
    </>
  );
}
