import type pg from 'pg';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { hashPassword, verifyPassword } from '#server/services/people/passwords.ts';
import { type ChildServer, startChildServer } from './child-server.ts';
import { fillBank } from './fill-bank.ts';
import { fillStudents } from './fill-students.ts';
import { asTheyCome, type LoadFigures, oneByOne, type Sending } from './load.ts';
import type { Options } from './options.ts';
import { post } from './post.ts';
import type { Probe } from './probe.ts';
import { signInAll } from './sessions.ts';

/** Seconds in which all students would arrive. */
const WINDOW = 300;
const QUESTIONS = 1200;
const CLASS_SIZE = 30;
const ANSWERS = 60;
/** Students who open a set with nobody else about, before the burst. */
const ALONE = 75;
const HASHES = 5;
const SECRET = 'a-secret-for-a-bench-only-a-secret-for-a-bench-only';

export interface BurstFigures {
  students: number;
  questions: number;
  perSecond: number;
  /** Opening a mixed set with nobody else about. */
  alone: LoadFigures;
  burst: LoadFigures;
  /** The server during the burst, and its memory before. */
  server: Probe;
  memoryBefore: number;
  /** Processor time in milliseconds that checking one password takes; sign-in is not part of the burst. */
  signIn: number;
}

async function cpuOfSignIn(): Promise<number> {
  const hash = await hashPassword(FACTORY_PASSWORD);
  const before = process.cpuUsage();
  for (let time = 0; time < HASHES; time += 1) await verifyPassword(hash, FACTORY_PASSWORD);
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000 / HASHES;
}

/** A school of students with one bank in common. */
async function fillSchool(admin: pg.Client, students: number): Promise<{ schoolId: string; studentIds: string[] }> {
  const school = await aSchool();
  const groups = Math.ceil(students / CLASS_SIZE);
  await fillBank(admin, school, { questions: QUESTIONS, groups });
  const studentIds = await fillStudents(admin, school, { students, groups, answers: ANSWERS });
  await admin.query('VACUUM ANALYZE');
  return { schoolId: school.id, studentIds };
}

async function measure(server: ChildServer, cookies: readonly string[], perSecond: number) {
  const sendings = cookies.map(
    (cookie): Sending =>
      () =>
        post(`${server.origin}/api/sets`, { kind: 'mixed' }, cookie),
  );
  const alone = await oneByOne(sendings.slice(0, ALONE));
  const { memory: memoryBefore } = await server.probe();
  const burst = await asTheyCome(sendings.slice(ALONE), perSecond);
  return { alone, burst, memoryBefore, server: await server.probe() };
}

/** Students arrive at the running server, each to open a mixed set, at the rate at which all come in five minutes. */
export async function measureBurst(
  admin: pg.Client,
  appUrl: string,
  { students, seconds }: Pick<Options, 'students' | 'seconds'>,
): Promise<BurstFigures> {
  const perSecond = students / WINDOW;
  const arriving = Math.min(students, Math.round(perSecond * seconds));
  const { schoolId, studentIds } = await fillSchool(admin, students + ALONE);
  const server = await startChildServer('./app-server.ts', {
    DATABASE_URL: appUrl,
    SESSION_SECRET: SECRET,
    LOG_LEVEL: 'silent',
  });
  try {
    const coming = studentIds.slice(0, ALONE + arriving);
    const cookies = await signInAll(admin, schoolId, coming, { secret: SECRET, origin: server.origin });
    const figures = await measure(server, cookies, perSecond);
    return { students: arriving, questions: QUESTIONS, perSecond, signIn: await cpuOfSignIn(), ...figures };
  } finally {
    await server.stop();
  }
}
