import { z } from 'zod';

/** What a person may be at a school. Tutor and SENCo are staff roles beside a main one. */
export const roleSchema = z.enum([
  'student',
  'carer',
  'teacher',
  'headOfDepartment',
  'headOfYear',
  'schoolAdmin',
  'tutor',
  'senco',
]);
export type Role = z.output<typeof roleSchema>;

export const roleWords: Record<Role, string> = {
  student: 'Student',
  carer: 'Carer',
  teacher: 'Teacher',
  headOfDepartment: 'Head of department',
  headOfYear: 'Head of year',
  schoolAdmin: 'School admin',
  tutor: 'Tutor',
  senco: 'SENCo',
};
