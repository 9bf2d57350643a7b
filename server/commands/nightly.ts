import { allSchoolIds } from '#server/db/directory.ts';
import { sequelize } from '#server/db/sequelize.ts';
import { type NightlyReport, runNightly } from '#server/jobs/nightly.ts';
import { loadOptimiser } from '#server/services/practice/optimiser.ts';

const optimise = loadOptimiser();

function words({ versions, checked, rebuilt, schoolFit, studentFits }: NightlyReport): string {
  const adopted = studentFits.filter((outcome) => outcome === 'adopted').length;
  return [
    `seconds of ${versions} questions set anew`,
    `recall of ${checked} students checked`,
    schoolFit === null ? 'the school’s weights stay' : `weights for the school: ${schoolFit}`,
    `${adopted} of ${studentFits.length} students’ own weights adopted`,
    `memory of ${rebuilt} students rebuilt`,
  ].join(', ');
}

try {
  if (!optimise) console.log('The optimiser is not installed here: weights stay as they are.');
  for (const schoolId of await allSchoolIds()) {
    console.log(`School ${schoolId}: ${words(await runNightly(schoolId, { optimise }))}.`);
  }
} finally {
  await sequelize.close();
}
