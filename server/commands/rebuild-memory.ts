import { parseArgs } from 'node:util';
import { allSchoolIds } from '#server/db/directory.ts';
import { withSchool } from '#server/db/scope.ts';
import { sequelize } from '#server/db/sequelize.ts';
import { rebuildStudent, studentsWithMemory } from '#server/services/practice/rebuild-student.ts';

/** Folds every student's memory anew, one transaction each, while the school goes on working. */
async function rebuildSchool(schoolId: string, only: string | undefined): Promise<number> {
  const everyone = await withSchool(schoolId, studentsWithMemory);
  const students = only === undefined ? everyone : everyone.filter((id) => id === only);
  let states = 0;
  let changed = 0;
  for (const id of students) {
    const rebuilt = await withSchool(schoolId, (scope) => rebuildStudent(scope, id));
    states += rebuilt.states;
    changed += rebuilt.changed;
  }
  if (students.length > 0) {
    console.log(`School ${schoolId}: ${students.length} students, ${states} memory states, ${changed} put right.`);
  }
  return students.length;
}

const { values } = parseArgs({ options: { student: { type: 'string' } } });
try {
  let students = 0;
  for (const schoolId of await allSchoolIds()) students += await rebuildSchool(schoolId, values.student);
  if (students === 0) console.log('There was nobody to rebuild.');
  // A student asked for by name and not found is a slip of whoever typed it.
  if (students === 0 && values.student !== undefined) process.exitCode = 1;
} finally {
  await sequelize.close();
}
