import type { Response } from 'supertest';
import { beforeAll, describe, expect, test } from 'vitest';
import { problemSchema } from '#shared/schemas/common.ts';
import { EXPECTATIONS, expectedStatus, placesOf } from '#tests/support/access-expectations.ts';
import { ask } from '#tests/support/access-request.ts';
import { type AccessWorld, anAccessWorld, type Place, type Things, type Who } from '#tests/support/access-world.ts';
import { browser, testApp } from '#tests/support/app.ts';
import { databaseHash } from '#tests/support/database-hash.ts';
import { nameOf, registry } from '#tests/support/registry.ts';

const app = testApp();
const routes = registry();
let world: AccessWorld;
beforeAll(async () => {
  world = await anAccessWorld(app);
});

test('every route has its expectation, and every expectation its route', () => {
  expect(routes.map(nameOf).sort()).toEqual(Object.keys(EXPECTATIONS).sort());
});

test('only these are reached without a session', () => {
  const open = Object.keys(EXPECTATIONS).filter((name) => EXPECTATIONS[name]?.isOpen);
  expect(
    routes
      .filter(({ access }) => access === 'anyone')
      .map(nameOf)
      .sort(),
  ).toEqual(open.sort());
});

test('a route that is not in the registry is not there', async () => {
  const mounted = new Set(routes.map(nameOf));
  for (const { path } of routes) {
    for (const method of ['get', 'post', 'put', 'delete'] as const) {
      if (mounted.has(nameOf({ method, path }))) continue;
      const response = await browser(app)
        [method](`/api${path.replace(/:\w+/g, 'x')}`)
        .send({});
      expect([401, 404], nameOf({ method, path })).toContain(response.status);
    }
  }
});

interface Cell {
  who: Who;
  place: Place;
  things: Things;
  status: number;
}

const guarded = routes.filter((route) => !EXPECTATIONS[nameOf(route)]?.isOpen);

describe.each(guarded.map((route) => ({ name: nameOf(route), route })))('$name', ({ name, route }) => {
  const expectation = EXPECTATIONS[name];
  if (!expectation) return;
  const cells: Cell[] = [];
  const title = ({ who, place }: Cell) => `${who}, ${place}`;
  const isRefusal = ({ status }: Cell) => status >= 400 && status !== expectation.passStatus;

  beforeAll(async () => {
    for (const who of Object.keys(world.agents) as Who[]) {
      for (const place of placesOf(expectation)) {
        const things = await world.things(who, place, expectation.status ?? 'live');
        cells.push({ who, place, things, status: expectedStatus(expectation, who, place) });
      }
    }
  });

  test('refuses everybody else, tells them nothing and changes nothing', async () => {
    const before = await databaseHash();
    const seen: Record<string, number> = {};
    const answers: { cell: Cell; response: Response }[] = [];
    for (const cell of cells.filter(isRefusal)) {
      const response = await ask(world.agents[cell.who], route, expectation, cell.things);
      seen[title(cell)] = response.status;
      answers.push({ cell, response });
    }
    expect(seen).toEqual(Object.fromEntries(cells.filter(isRefusal).map((cell) => [title(cell), cell.status])));
    for (const status of [401, 403, 404]) {
      const bodies = new Set(answers.filter(({ cell }) => cell.status === status).map(({ response }) => response.text));
      expect(bodies.size, `one body for every ${status}`).toBeLessThanOrEqual(1);
    }
    for (const { response } of answers) {
      expect(problemSchema.parse(response.body).errors).toBeUndefined();
      for (const id of world.foreignIds) expect(response.text).not.toContain(id);
    }
    expect(await databaseHash()).toEqual(before);
  });

  test('lets through whom it is for', async () => {
    const passing = cells.filter((cell) => !isRefusal(cell));
    expect(passing.length).toBeGreaterThan(0);
    const seen: Record<string, number> = {};
    for (const cell of passing) {
      const response = await ask(world.agents[cell.who], route, expectation, cell.things);
      seen[title(cell)] = response.status;
      for (const id of world.foreignIds) expect(response.text, title(cell)).not.toContain(id);
    }
    expect(seen).toEqual(Object.fromEntries(passing.map((cell) => [title(cell), cell.status])));
  });
});

test('what a request names beside its address is looked for in the same school and set', async () => {
  const [own, other, elsewhere] = await Promise.all(
    (['own', 'other', 'elsewhere'] as const).map((place) => world.things('teacher', place, 'draft')),
  );
  if (!own || !other || !elsewhere) throw new Error('no things were made');
  const { student, teacher, headOfDepartment } = world.agents;
  const before = await databaseHash();
  for (const foreign of [other, elsewhere]) {
    const answer = EXPECTATIONS['POST /sets/:id/answers']?.request?.(foreign).body;
    await student.post(`/api/sets/${own.setId}/answers`).send(answer).expect(404);
    const marking = EXPECTATIONS['POST /sets/:id/self-marks']?.request?.(foreign).body;
    await student.post(`/api/sets/${own.setId}/self-marks`).send(marking).expect(404);
  }
  const taught = { taughtOn: '2026-02-02' };
  await teacher.put(`/api/classes/${own.classId}/topics/${elsewhere.topicId}/taught`).send(taught).expect(404);
  const save = EXPECTATIONS['PUT /questions/:id/draft']?.request?.(elsewhere).body;
  await teacher.put(`/api/questions/${own.questionId}/draft`).send(save).expect(422);
  const topic = EXPECTATIONS['POST /subjects/:subjectId/topics']?.request?.(elsewhere).body;
  await headOfDepartment.post(`/api/subjects/${own.subjectId}/topics`).send(topic).expect(422);
  expect(await databaseHash()).toEqual(before);
});
