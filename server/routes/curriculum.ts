import { type Route, route } from '#server/http/registry.ts';
import { createTopic } from '#server/services/curriculum/create-topic.ts';
import { listSubjects } from '#server/services/curriculum/list-subjects.ts';
import { listTopics } from '#server/services/curriculum/list-topics.ts';
import { mergeTopic } from '#server/services/curriculum/merge-topic.ts';
import { setTaught } from '#server/services/curriculum/set-taught.ts';
import {
  createTopicSchema,
  mergeTopicSchema,
  setTaughtSchema,
  subjectParamsSchema,
  taughtParamsSchema,
  topicParamsSchema,
} from '#shared/schemas/curriculum.ts';
import type { Role } from '#shared/schemas/role.ts';

const access: Role[] = ['teacher', 'headOfDepartment'];

/** Subjects, their topics, and when classes were taught them. */
export const curriculumRoutes: Route[] = [
  route({ method: 'get', path: '/subjects', access, run: (scope) => listSubjects(scope) }),
  route({
    method: 'get',
    path: '/subjects/:subjectId/topics',
    access,
    params: subjectParamsSchema,
    run: (scope, { params }) => listTopics(scope, params.subjectId),
  }),
  route({
    method: 'post',
    path: '/subjects/:subjectId/topics',
    access,
    params: subjectParamsSchema,
    body: createTopicSchema,
    status: 201,
    run: (scope, { params, body }) => createTopic(scope, params.subjectId, body),
  }),
  route({
    method: 'post',
    path: '/topics/:id/merge',
    access,
    params: topicParamsSchema,
    body: mergeTopicSchema,
    run: (scope, { params, body }) => mergeTopic(scope, params.id, body.intoTopicId),
  }),
  route({
    method: 'put',
    path: '/classes/:classId/topics/:topicId/taught',
    access,
    params: taughtParamsSchema,
    body: setTaughtSchema,
    run: (scope, { params, body }) => setTaught(scope, params, body.taughtOn),
  }),
];
