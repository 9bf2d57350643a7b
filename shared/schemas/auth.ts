import { z } from 'zod';
import { daySchema } from './common.ts';
import { roleSchema } from './role.ts';

export const schoolCodeSchema = z
  .string()
  .trim()
  .toLowerCase()
  .regex(/^[a-z0-9-]{2,40}$/, 'A school code has letters, digits and hyphens only.');

export const schoolParamsSchema = z.object({ code: schoolCodeSchema });

/** What the sign-in page needs before anybody is known. Demo people only where the demo was seeded. */
export const signInPageSchema = z.object({
  code: z.string(),
  name: z.string(),
  demoPeople: z.array(z.object({ username: z.string(), name: z.string(), role: roleSchema, note: z.string() })),
});
export type SignInPageDto = z.output<typeof signInPageSchema>;

/** Longest password a sign-in form may send; what a new one must be is the password rule's matter. */
const PASSWORD_LIMIT = 128;
const TOO_LONG = 'That is too long.';

export const signInSchema = z.strictObject({
  schoolCode: schoolCodeSchema,
  /** School username or e-mail address. */
  name: z.string().trim().min(1, 'Type your username or e-mail address.').max(200, TOO_LONG),
  password: z
    .string()
    .min(1, 'Type your password.')
    .max(PASSWORD_LIMIT * 4, TOO_LONG),
  isOwnDevice: z.boolean(),
});
export type SignIn = z.output<typeof signInSchema>;

export const demoSignInSchema = z.strictObject({ schoolCode: schoolCodeSchema, username: z.string().min(1).max(200) });

export const changePasswordSchema = z.strictObject({
  current: z
    .string()
    .min(1, 'Type your password as it is now.')
    .max(PASSWORD_LIMIT * 4, TOO_LONG),
  next: z
    .string()
    .min(1, 'Type a new password.')
    .max(PASSWORD_LIMIT * 4, TOO_LONG),
});
export type ChangePassword = z.output<typeof changePasswordSchema>;

/** Who is signed in, what they are here, and what day it is at the school. */
export const meSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  username: z.string(),
  school: z.object({ code: z.string(), name: z.string(), zone: z.string() }),
  today: daySchema,
  /** One line a membership: the role and what it reaches ("Chemistry", "Year 11", "11K", a child's name). */
  memberships: z.array(z.object({ role: roleSchema, scope: z.string().nullable() })),
  /** Capabilities, so that screens never work out rights from roles. */
  can: z.object({
    practise: z.boolean(),
    writeQuestions: z.boolean(),
    reviewQuestions: z.boolean(),
    readItemStatistics: z.boolean(),
    readEstimates: z.boolean(),
    manageSchool: z.boolean(),
  }),
  isDemo: z.boolean(),
});
export type MeDto = z.output<typeof meSchema>;
