import { z } from 'zod';
import { type Route, route } from '#server/http/registry.ts';
import { chooseForClass } from '#server/services/questions/choose-for-class.ts';
import { createQuestion } from '#server/services/questions/create-question.ts';
import { discardDraft } from '#server/services/questions/discard-draft.ts';
import { listClassQuestions } from '#server/services/questions/list-class-questions.ts';
import { listQuestions } from '#server/services/questions/list-questions.ts';
import { listReviews } from '#server/services/questions/list-reviews.ts';
import { putQuestionLive } from '#server/services/questions/put-question-live.ts';
import { retireQuestion } from '#server/services/questions/retire-question.ts';
import { returnToAuthor } from '#server/services/questions/return-to-author.ts';
import { saveDraft } from '#server/services/questions/save-draft.ts';
import { sendForReview } from '#server/services/questions/send-for-review.ts';
import { showQuestion } from '#server/services/questions/show-question.ts';
import { startVersion } from '#server/services/questions/start-version.ts';
import { chooseForClassSchema, classQuestionParamsSchema } from '#shared/schemas/class-question.ts';
import { idParamsSchema, pageQuerySchema } from '#shared/schemas/common.ts';
import {
  createQuestionSchema,
  listQuestionsSchema,
  returnDraftSchema,
  revisionSchema,
  saveDraftSchema,
} from '#shared/schemas/question.ts';
import type { Role } from '#shared/schemas/role.ts';

const access: Role[] = ['teacher', 'headOfDepartment'];
const params = idParamsSchema;
const nothing = z.strictObject({});

/** The question bank: writing, review, going live. */
export const questionRoutes: Route[] = [
  route({
    method: 'get',
    path: '/questions',
    access,
    query: listQuestionsSchema,
    run: (scope, { query }) => listQuestions(scope, query),
  }),
  route({
    method: 'post',
    path: '/questions',
    access,
    body: createQuestionSchema,
    status: 201,
    run: (scope, { body }) => createQuestion(scope, body),
  }),
  route({
    method: 'get',
    path: '/questions/:id',
    access,
    params,
    run: (scope, input) => showQuestion(scope, input.params.id),
  }),
  route({
    method: 'put',
    path: '/questions/:id/draft',
    access,
    params,
    body: saveDraftSchema,
    run: (scope, input) => saveDraft(scope, input.params.id, input.body),
  }),
  route({
    method: 'delete',
    path: '/questions/:id/draft',
    access,
    params,
    body: revisionSchema,
    run: (scope, input) => discardDraft(scope, input.params.id, input.body.revision),
  }),
  route({
    method: 'post',
    path: '/questions/:id/send',
    access,
    params,
    body: revisionSchema,
    run: (scope, input) => sendForReview(scope, input.params.id, input.body.revision),
  }),
  route({
    method: 'post',
    path: '/questions/:id/live',
    access,
    params,
    body: revisionSchema,
    run: (scope, input) => putQuestionLive(scope, input.params.id, input.body.revision),
  }),
  route({
    method: 'post',
    path: '/questions/:id/return',
    access,
    params,
    body: returnDraftSchema,
    run: (scope, input) => returnToAuthor(scope, input.params.id, input.body),
  }),
  route({
    method: 'post',
    path: '/questions/:id/versions',
    access,
    params,
    body: nothing,
    run: (scope, input) => startVersion(scope, input.params.id),
  }),
  route({
    method: 'post',
    path: '/questions/:id/retire',
    access,
    params,
    body: nothing,
    run: (scope, input) => retireQuestion(scope, input.params.id),
  }),
  route({
    method: 'get',
    path: '/questions/:id/classes',
    access,
    params,
    run: (scope, input) => listClassQuestions(scope, input.params.id),
  }),
  route({
    method: 'put',
    path: '/questions/:id/classes/:classId',
    access,
    params: classQuestionParamsSchema,
    body: chooseForClassSchema,
    run: (scope, input) => chooseForClass(scope, input.params, input.body),
  }),
  route({
    method: 'get',
    path: '/review-queue',
    access,
    query: pageQuerySchema,
    run: (scope, { query }) => listReviews(scope, query),
  }),
];
