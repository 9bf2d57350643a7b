import { beforeAll, describe, expect, test, vi } from 'vitest';
import { EXPECTATIONS } from '#tests/support/access-expectations.ts';
import { ask } from '#tests/support/access-request.ts';
import { type AccessWorld, anAccessWorld, type Who } from '#tests/support/access-world.ts';
import { testApp } from '#tests/support/app.ts';
import { databaseHash } from '#tests/support/database-hash.ts';
import { nameOf, registry } from '#tests/support/registry.ts';

// As if every rule had been written wrong: what is left is the tenant wall alone.
vi.mock('#server/policies/authorize.ts', () => ({ authorize: () => undefined }));

const app = testApp();
let world: AccessWorld;
beforeAll(async () => {
  world = await anAccessWorld(app);
});

const WHO: Who[] = ['student', 'teacher', 'headOfDepartment', 'multiRole'];
const naming = registry().filter((route) => (EXPECTATIONS[nameOf(route)]?.names ?? 'nothing') !== 'nothing');

test('without its policies the app would let a colleague and a classmate do anything', async () => {
  const mine = await world.things('teacher', 'otherSubject', 'draft');
  await world.agents.teacher.get(`/api/questions/${mine.questionId}`).expect(200);
  await world.agents.student.get(`/api/sets/${mine.setId}`).expect(200);
});

describe.each(naming.map((route) => ({ name: nameOf(route), route })))('$name', ({ name, route }) => {
  const expectation = EXPECTATIONS[name];
  if (!expectation) return;

  test('another school’s is still as good as none', async () => {
    const elsewhere = await world.things('teacher', 'elsewhere', expectation.status ?? 'live');
    const { setId, subjectId, classId, topicInAddress, questionId } = await world.things('teacher', 'unknown', 'live');
    const unknown = { ...elsewhere, setId, subjectId, classId, topicInAddress, questionId };
    const before = await databaseHash();
    for (const who of WHO) {
      const foreign = await ask(world.agents[who], route, expectation, elsewhere);
      const none = await ask(world.agents[who], route, expectation, unknown);
      expect([foreign.status, foreign.text], who).toEqual([none.status, none.text]);
      // A list by subject may be empty; a thing is not there.
      if (foreign.status === 200) expect(foreign.body.items, who).toEqual([]);
      else expect([403, 404, 422], who).toContain(foreign.status);
      for (const id of world.foreignIds) expect(foreign.text, who).not.toContain(id);
    }
    expect(await databaseHash()).toEqual(before);
  });
});
