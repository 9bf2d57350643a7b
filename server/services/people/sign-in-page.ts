import { findSchoolId } from '#server/db/directory.ts';
import { withSchool } from '#server/db/scope.ts';
import { notFound } from '#server/errors.ts';
import { School } from '#server/models/school.ts';
import type { SignInPageDto } from '#shared/schemas/auth.ts';

/** The demo school's people: offered on its sign-in page, and signed in by one click. */
export interface DemoPeople {
  people: SignInPageDto['demoPeople'];
  find: (schoolCode: string, username: string, requestId?: string) => Promise<{ userId: string; schoolId: string }>;
}

/** The school's name for its sign-in page. @throws Problem 404 where no school has the code */
export async function showSignInPage(code: string, demo?: DemoPeople): Promise<SignInPageDto> {
  const schoolId = await findSchoolId(code);
  if (!schoolId) throw notFound();
  return withSchool(schoolId, async () => {
    const school = await School.findByPk(schoolId, { rejectOnEmpty: notFound() });
    return { code: school.code, name: school.name, demoPeople: school.isDemo && demo ? demo.people : [] };
  });
}
