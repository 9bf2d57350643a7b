import { randomUUID } from 'node:crypto';
import { withSchool } from '#server/db/scope.ts';
import { School } from '#server/models/school.ts';
import { YearGroup } from '#server/models/year-group.ts';
import { uniqueCode } from './unique.ts';

export interface FactorySchool {
  id: string;
  code: string;
  yearGroupId: string;
}

/** A school with one year group. The database enters it in the directory of sign-in addresses by itself. */
export async function aSchool(
  values: Partial<{ zone: string; isDemo: boolean; seasonEndsOn: string }> = {},
): Promise<FactorySchool> {
  const id = randomUUID();
  const code = uniqueCode('school');
  return withSchool(id, async () => {
    await School.create({
      schoolId: id,
      name: `School ${code}`,
      code,
      zone: 'Europe/London',
      seasonEndsOn: '2099-06-30',
      ...values,
    });
    const year = await YearGroup.create({ name: 'Year 11' });
    return { id, code, yearGroupId: year.id };
  });
}
