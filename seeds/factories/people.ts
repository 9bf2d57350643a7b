import { withSchool } from '#server/db/scope.ts';
import { Membership } from '#server/models/membership.ts';
import { User } from '#server/models/user.ts';
import { hashPassword } from '#server/services/people/passwords.ts';
import type { Role } from '#shared/schemas/role.ts';
import { FACTORY_PASSWORD } from './password.ts';
import type { FactorySchool } from './school.ts';
import { unique } from './unique.ts';

let hash: Promise<string> | undefined;

export interface FactoryPerson {
  id: string;
  username: string;
  name: string;
  schoolId: string;
  schoolCode: string;
}

interface MembershipValues {
  role: Role;
  subjectId?: string;
  yearGroupId?: string;
  tutorGroupId?: string;
  validFrom?: string;
  validTo?: string;
}

/** A person with any number of roles. */
export async function aPerson(school: FactorySchool, ...memberships: MembershipValues[]): Promise<FactoryPerson> {
  hash ??= hashPassword(FACTORY_PASSWORD);
  const passwordHash = await hash;
  return withSchool(school.id, async () => {
    const n = unique();
    const user = await User.create({
      username: `person${n}`,
      name: `Person ${n}`,
      sortName: `Person ${n}`,
      passwordHash,
    });
    for (const values of memberships) await Membership.create({ validFrom: '2020-01-01', userId: user.id, ...values });
    return { id: user.id, username: user.username, name: user.name, schoolId: school.id, schoolCode: school.code };
  });
}

/** A student of the school's year group. */
export const aStudent = (school: FactorySchool): Promise<FactoryPerson> =>
  aPerson(school, { role: 'student', yearGroupId: school.yearGroupId });

/** A teacher of one subject. */
export const aTeacher = (school: FactorySchool, subjectId: string): Promise<FactoryPerson> =>
  aPerson(school, { role: 'teacher', subjectId });

/** Somebody who leads a department and teaches in it. */
export const aHeadOfDepartment = (school: FactorySchool, subjectId: string): Promise<FactoryPerson> =>
  aPerson(school, { role: 'headOfDepartment', subjectId }, { role: 'teacher', subjectId });

export const aHeadOfYear = (school: FactorySchool): Promise<FactoryPerson> =>
  aPerson(school, { role: 'headOfYear', yearGroupId: school.yearGroupId });

export const aSchoolAdmin = (school: FactorySchool): Promise<FactoryPerson> => aPerson(school, { role: 'schoolAdmin' });

export const aCarer = (school: FactorySchool): Promise<FactoryPerson> => aPerson(school, { role: 'carer' });
