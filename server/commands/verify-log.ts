import { allSchoolIds } from '#server/db/directory.ts';
import { withSchool } from '#server/db/scope.ts';
import { sequelize } from '#server/db/sequelize.ts';
import { verifyLog } from '#server/services/practice/verify-log.ts';

/** Faults printed in full; the rest are counted. */
const SHOWN = 20;

let faults = 0;
for (const schoolId of await allSchoolIds()) {
  const report = await withSchool(schoolId, verifyLog, { isSnapshot: true });
  faults += report.faults.length;
  console.log(
    `School ${schoolId}: ${report.students} students, ${report.answers} answers, ${report.states} memory states, ` +
      `${report.faults.length} faults.`,
  );
  for (const fault of report.faults.slice(0, SHOWN)) {
    console.log(`  ${fault.fault}: student ${fault.userId}, question ${fault.questionId}`);
  }
}
await sequelize.close();
console.log(faults === 0 ? 'Every memory state is the fold of its answer log.' : `${faults} faults found.`);
process.exitCode = faults === 0 ? 0 : 1;
