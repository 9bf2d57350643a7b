/** The subject named in the address; the first one where none or an unknown one is named. */
export function chooseSubject<Subject extends { id: string }>(
  subjects: readonly Subject[],
  search: URLSearchParams,
): Subject | undefined {
  const wanted = search.get('subject');
  return subjects.find((subject) => subject.id === wanted) ?? subjects[0];
}
