import { QueryTypes } from 'sequelize';
import { sequelize } from './sequelize.ts';

/** The school behind a sign-in address. The only look-up made before a school is known. */
export async function findSchoolId(code: string): Promise<string | null> {
  const rows = await sequelize.query<{ school_id: string }>('SELECT school_id FROM school_directory WHERE code = $1', {
    bind: [code],
    type: QueryTypes.SELECT,
  });
  return rows[0]?.school_id ?? null;
}

/** Every school, for jobs and checks that go through them one by one. */
export async function allSchoolIds(): Promise<string[]> {
  const rows = await sequelize.query<{ school_id: string }>('SELECT school_id FROM school_directory ORDER BY code', {
    type: QueryTypes.SELECT,
  });
  return rows.map((row) => row.school_id);
}

/** True once the database answers. */
export async function isDatabaseReady(): Promise<boolean> {
  try {
    await sequelize.query('SELECT 1');
    return true;
  } catch {
    return false;
  }
}
