import { redirect } from 'react-router-dom';
import { EmptyState } from '#src/components/empty-state.tsx';
import { queryClient } from '#src/lib/query-client.ts';
import { subjectsQuery } from '#src/queries/curriculum.ts';

/** Leads to the topics of the first subject, where the others can be chosen. */
export async function loader(): Promise<Response | null> {
  const { items } = await queryClient.ensureQueryData(subjectsQuery());
  const [first] = items;
  return first ? redirect(`/subjects/${first.id}/topics`) : null;
}

export function Component() {
  return (
    <div className="page">
      <title>Topics – Plait</title>
      <h1 className="mb-6">Topics</h1>
      <EmptyState title="No subject yet">
        Your subjects and their topics appear here once the school has given you a subject to teach.
      </EmptyState>
    </div>
  );
}
