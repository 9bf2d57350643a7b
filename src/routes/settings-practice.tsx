import { useSuspenseQuery } from '@tanstack/react-query';
import { SubjectsPerSet } from '#src/features/settings/subjects-per-set.tsx';
import { queryClient } from '#src/lib/query-client.ts';
import { practiceSettingsQuery } from '#src/queries/practice-settings.ts';

export async function loader() {
  await queryClient.ensureQueryData(practiceSettingsQuery());
  return null;
}

/** How the school's students practise, for the school admin. */
export function Component() {
  const { data: settings } = useSuspenseQuery(practiceSettingsQuery());
  return (
    <div className="page !max-w-[66rem]">
      <title>Settings – Plait</title>
      <h1 className="mb-7">Settings</h1>
      <section className="mrow" aria-labelledby="practice">
        <h2 className="lab" id="practice">
          Practice
        </h2>
        <div className="-my-3.5 min-w-0 [&_.seg>label]:min-h-11">
          <SubjectsPerSet settings={settings} />
        </div>
      </section>
      <p className="border-t border-rule pt-5 text-sm text-ink-2">
        Changes are saved as you make them, for every student of the school.
      </p>
    </div>
  );
}
