import { z } from 'zod';
import { type Route, route } from '#server/http/registry.ts';
import { handIn } from '#server/services/practice/hand-in.ts';
import { listMyTopics } from '#server/services/practice/list-my-topics.ts';
import { openSet } from '#server/services/practice/open-set.ts';
import { selfMark } from '#server/services/practice/self-mark.ts';
import { showSet } from '#server/services/practice/show-set.ts';
import { showToday } from '#server/services/practice/show-today.ts';
import { finishSet, showSummary } from '#server/services/practice/summarise-set.ts';
import { idParamsSchema } from '#shared/schemas/common.ts';
import { handInSchema, openSetSchema, selfMarkSchema } from '#shared/schemas/practice.ts';

const student = { access: ['student' as const], params: idParamsSchema };

/** A student's own practice. */
export const practiceRoutes: Route[] = [
  route({ method: 'get', path: '/today', access: ['student'], run: showToday }),
  route({
    method: 'post',
    path: '/sets',
    access: ['student'],
    body: openSetSchema,
    run: (scope, { body }) => openSet(scope, body),
  }),
  route({ method: 'get', path: '/sets/:id', ...student, run: (scope, { params }) => showSet(scope, params.id) }),
  route({
    method: 'post',
    path: '/sets/:id/answers',
    ...student,
    body: handInSchema,
    limit: 'answers',
    run: (scope, { params, body }) => handIn(scope, params.id, body),
  }),
  route({
    method: 'post',
    path: '/sets/:id/self-marks',
    ...student,
    body: selfMarkSchema,
    limit: 'answers',
    run: (scope, { params, body }) => selfMark(scope, params.id, body),
  }),
  route({
    method: 'post',
    path: '/sets/:id/finish',
    ...student,
    body: z.strictObject({}),
    run: (scope, { params }) => finishSet(scope, params.id),
  }),
  route({
    method: 'get',
    path: '/sets/:id/summary',
    ...student,
    run: (scope, { params }) => showSummary(scope, params.id),
  }),
  route({ method: 'get', path: '/my-topics', access: ['student'], run: listMyTopics }),
];
