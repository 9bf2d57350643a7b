import { describe, expect, test } from 'vitest';
import { aSubject } from '#seeds/factories/curriculum.ts';
import {
  aHeadOfDepartment,
  aHeadOfYear,
  aSchoolAdmin,
  aStudent,
  aTeacher,
  type FactoryPerson,
} from '#seeds/factories/people.ts';
import { aMemoryModel, aRecallCheck } from '#seeds/factories/recall-check.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { estimatesSchema } from '#shared/schemas/estimate.ts';
import { browser, signedInAs, testApp } from '#tests/support/app.ts';
import { countQueries } from '#tests/support/count-queries.ts';

const app = testApp();

const read = async (person: FactoryPerson) =>
  estimatesSchema.parse((await (await signedInAs(app, person)).get('/api/estimates').expect(200)).body);

/** Students of a school, with the same check each: 60 attempts expected at 85% and 20 at 35%. */
async function checked(school: FactorySchool, count: number, recalled: { high: number; low: number }, at?: Date) {
  const students: FactoryPerson[] = [];
  for (let n = 0; n < count; n++) {
    const student = await aStudent(school);
    students.push(student);
    const bands = [
      { band: 8, attempts: 60, expected: 0.85, recalled: recalled.high },
      { band: 3, attempts: 20, expected: 0.35, recalled: recalled.low },
    ];
    await aRecallCheck(school, student, bands, at);
  }
  return students;
}

describe('estimates over a school', () => {
  test('weigh each student by their attempts, and pool the bands', async () => {
    const school = await aSchool();
    await checked(school, 9, { high: 48, low: 8 });
    // A student with more attempts than any other weighs more, and is alone in the highest band.
    const busy = await aStudent(school);
    await aRecallCheck(school, busy, [
      { band: 8, attempts: 100, expected: 0.81, recalled: 90 },
      { band: 3, attempts: 60, expected: 0.31, recalled: 30 },
      { band: 9, attempts: 40, expected: 0.95, recalled: 40 },
    ]);
    const estimates = await read(await aSchoolAdmin(school));
    expect(estimates).toMatchObject({ students: 10, attempts: 920, thresholdPoints: -8 });
    // Observed (9 × 56 + 160) ÷ 920; expected (9 × 58 + 81 + 18.6 + 38) ÷ 920.
    expect(estimates.check).toEqual({ observed: 72, expected: 72, driftPoints: 0.5, isPastThreshold: false });
    expect(estimates.bands.map(({ from, to }) => [from, to]).at(-1)).toEqual([90, 100]);
    expect(estimates.bands[8]?.figures).toEqual({ attempts: 640, expected: 84, observed: 82 });
    expect(estimates.bands[3]?.figures).toEqual({ attempts: 240, expected: 34, observed: 43 });
    // Held back: one student's band, and those that nobody is in.
    expect(estimates.bands.filter(({ figures }) => figures !== null)).toHaveLength(2);
  });

  test('of fewer than ten students are held back, and so is a band and a count of fewer', async () => {
    const school = await aSchool();
    await checked(school, 9, { high: 30, low: 2 });
    const admin = await aSchoolAdmin(school);
    const few = await read(admin);
    expect(few).toMatchObject({ students: 9, attempts: 720, check: null, driftingStudents: null });
    expect(few.bands.filter(({ figures }) => figures !== null)).toEqual([]);
    await checked(school, 1, { high: 30, low: 2 });
    const enough = await read(admin);
    // Each student 32 of 80 against 58: 32.5 points too hopeful.
    expect(enough.check).toEqual({ observed: 40, expected: 73, driftPoints: -32.5, isPastThreshold: true });
    expect(enough.driftingStudents).toBe(10);
    await checked(school, 1, { high: 52, low: 7 });
    expect((await read(admin)).driftingStudents).toBe(10);
  });

  test('count nobody as drifting on fewer than fifty attempts', async () => {
    const school = await aSchool();
    for (let n = 0; n < 10; n++) {
      const bands = [{ band: 8, attempts: 49, expected: 0.85, recalled: 10 }];
      await aRecallCheck(school, await aStudent(school), bands);
    }
    expect((await read(await aSchoolAdmin(school))).driftingStudents).toBeNull();
  });

  test('say so before the first check', async () => {
    const school = await aSchool();
    const nothing = await read(await aHeadOfYear(school));
    expect(nothing).toMatchObject({ checkedOn: null, students: 0, attempts: 0, check: null, models: [] });
    expect(nothing.studentFits).toEqual({ tried: null, adopted: null });
  });

  test('name the day of the newest check by the school’s own clock', async () => {
    const school = await aSchool();
    // Half past eleven at night in UTC is the next day in London's summer.
    await checked(school, 1, { high: 50, low: 8 }, new Date('2027-05-03T23:30:00Z'));
    await checked(school, 1, { high: 50, low: 8 }, new Date('2027-05-02T02:00:00Z'));
    expect((await read(await aSchoolAdmin(school))).checkedOn).toBe('2027-05-04');
  });

  test('list the newest fifty weights of the school, with the one in use', async () => {
    const school = await aSchool();
    for (let version = 1; version <= 51; version++) {
      await aMemoryModel(school, { version, isAdopted: version === 1 || version === 49 });
    }
    const { models } = await read(await aSchoolAdmin(school));
    expect(models.map((model) => model.version)).toEqual(Array.from({ length: 50 }, (_version, at) => 51 - at));
    expect(models.filter((model) => model.isInUse).map((model) => model.version)).toEqual([49]);
    expect(models[0]).toMatchObject({
      attempts: 1200,
      logLossBefore: 0.6123,
      logLossAfter: 0.3061,
      driftPoints: -9.1,
      isAdopted: false,
    });
  });

  test('count students with weights of their own from ten on, and list none of them', async () => {
    const school = await aSchool();
    const admin = await aSchoolAdmin(school);
    for (let n = 0; n < 10; n++) {
      const student = await aStudent(school);
      await aMemoryModel(school, { student, version: 1, isAdopted: n > 0 });
      await aMemoryModel(school, { student, version: 2, isAdopted: n > 0 });
    }
    const { studentFits, models } = await read(admin);
    expect(studentFits).toEqual({ tried: 10, adopted: null });
    expect(models).toEqual([]);
  });

  test('take the same number of statements for any number of students', async () => {
    const school = await aSchool();
    const agent = await signedInAs(app, await aSchoolAdmin(school));
    const count = async () => (await countQueries(() => agent.get('/api/estimates').expect(200))).queries;
    const before = await count();
    await checked(school, 12, { high: 50, low: 8 });
    expect(await count()).toBe(before);
  });
});

describe('estimates are read', () => {
  test('by heads and admins, of their own school alone', async () => {
    const school = await aSchool();
    const subject = await aSubject(school);
    await checked(await aSchool(), 10, { high: 48, low: 8 });
    for (const person of [
      await aHeadOfDepartment(school, subject.id),
      await aHeadOfYear(school),
      await aSchoolAdmin(school),
    ]) {
      expect((await read(person)).students).toBe(0);
    }
  });

  test('by nobody else', async () => {
    const school = await aSchool();
    const subject = await aSubject(school);
    await browser(app).get('/api/estimates').expect(401);
    for (const person of [await aTeacher(school, subject.id), await aStudent(school)]) {
      const refused = await (await signedInAs(app, person)).get('/api/estimates').expect(403);
      expect(refused.headers['content-type']).toMatch('application/problem+json');
    }
  });
});
