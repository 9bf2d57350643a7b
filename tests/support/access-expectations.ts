import { randomUUID } from 'node:crypto';
import { aNumberBody } from '#seeds/factories/question.ts';
import type { CreateTopic } from '#shared/schemas/curriculum.ts';
import type { HandIn, SelfMark } from '#shared/schemas/practice.ts';
import type { CreateQuestion, SaveDraft, VersionStatus } from '#shared/schemas/question.ts';
import type { Place, Things, Who } from './access-world.ts';

/** What a route may be asked for, and who gets what. Whoever is not named is refused. */
export interface Expectation {
  /** Routes reached without a session: their own tests say the rest. */
  isOpen?: true;
  /** Fills in the address below /api, and the body. */
  request?: (things: Things) => { path?: string; body?: object };
  /** Where a thing is asked for: in the address, so that refusal is 404 for all, or in the body or query. */
  names?: 'nothing' | 'inAddress' | 'inRequest';
  /** State of the question it is asked of. */
  status?: VersionStatus;
  /** Who passes, place by place; `own` stands for the route itself where it names nothing. */
  passes?: Partial<Record<Place, Who[]>>;
  /** Who may see the thing and is refused the act: 403. */
  refused?: Partial<Record<Place, Who[]>>;
  /** Status of those who pass; 200 unless said. */
  passStatus?: number;
}

const SIGNED_IN: Who[] = [
  'roleless',
  'student',
  'carer',
  'teacher',
  'headOfDepartment',
  'headOfYear',
  'schoolAdmin',
  'tutor',
  'senco',
  'multiRole',
];
const STUDENT: Who[] = ['student'];
const WORKS: Who[] = ['teacher', 'headOfDepartment', 'multiRole'];
const LEADS: Who[] = ['headOfDepartment'];
const TEACHES: Who[] = ['teacher', 'multiRole'];
const ADMIN: Who[] = ['schoolAdmin'];

const draft = { kind: 'shortAnswer' as const, tier: null, expectedSeconds: 60 };
const revision = () => ({ body: { revision: 1 } });
const nothing = () => ({ body: {} });

/** A student's own sets: theirs alone, whoever else teaches them or answers for them. */
const ownSet: Expectation = { names: 'inAddress', passes: { own: STUDENT } };
/** A question in any state: whoever works in its subject. */
const anyQuestion: Expectation = { names: 'inAddress', passes: { own: WORKS, other: WORKS } };
/** A draft: its author, and the head of its department. */
const ownDraft: Expectation = {
  names: 'inAddress',
  status: 'draft',
  passes: { own: WORKS, other: LEADS },
  refused: { other: TEACHES },
};
const inSubject: Expectation = { passes: { own: WORKS, other: WORKS } };

export const EXPECTATIONS: Record<string, Expectation> = {
  'GET /schools/:code': { isOpen: true },
  'POST /sign-in': { isOpen: true },
  'POST /demo-sign-in': { isOpen: true },
  'POST /sign-out': { isOpen: true },
  'POST /csp-report': { isOpen: true },
  'GET /me': { passes: { own: SIGNED_IN } },
  // A wrong present password: the answer of somebody who was let through.
  'POST /me/password': {
    request: () => ({ body: { current: 'not the right words', next: 'four quiet words of mine' } }),
    passes: { own: SIGNED_IN },
    passStatus: 422,
  },
  'POST /me/heartbeat': { request: nothing, passes: { own: SIGNED_IN }, passStatus: 204 },

  'GET /today': { passes: { own: STUDENT } },
  'POST /sets': { request: () => ({ body: { kind: 'mixed' } }), passes: { own: STUDENT } },
  'GET /my-topics': { passes: { own: STUDENT } },
  'GET /sets/:id': ownSet,
  'GET /sets/:id/summary': ownSet,
  'POST /sets/:id/answers': {
    ...ownSet,
    request: ({ setItemId }) => ({
      body: {
        id: randomUUID(),
        setItemId,
        responses: ['42'],
        howSure: 'certain',
        seconds: 9,
        ageMs: 0,
      } satisfies HandIn,
    }),
  },
  'POST /sets/:id/self-marks': {
    ...ownSet,
    request: ({ answerId }) => ({ body: { id: randomUUID(), answerId, ticks: [[true, true]] } satisfies SelfMark }),
  },
  'POST /sets/:id/finish': { ...ownSet, request: nothing },

  'GET /school/practice-settings': { passes: { own: ADMIN } },
  'PUT /school/practice-settings': { request: () => ({ body: { subjectsPerSet: 5 } }), passes: { own: ADMIN } },

  'GET /subjects': { passes: { own: WORKS } },
  'GET /subjects/:subjectId/topics': { ...inSubject, names: 'inAddress' },
  'POST /subjects/:subjectId/topics': {
    names: 'inAddress',
    request: ({ specificationId }) => ({
      body: {
        id: randomUUID(),
        specificationId,
        parentId: null,
        number: randomUUID().slice(0, 8),
        title: 'Ratio',
        tier: null,
        option: null,
        weights: [],
      } satisfies CreateTopic,
    }),
    passes: { own: LEADS, other: LEADS },
    refused: { own: TEACHES, other: TEACHES },
    passStatus: 201,
  },
  // Into itself: the answer of somebody who was let through, and nothing merged.
  'POST /topics/:id/merge': {
    names: 'inAddress',
    request: ({ topicId, topicInAddress }) => ({
      path: `/topics/${topicInAddress}/merge`,
      body: { intoTopicId: topicId },
    }),
    passes: { own: LEADS, other: LEADS },
    refused: { own: TEACHES, other: TEACHES },
    passStatus: 422,
  },
  'PUT /classes/:classId/topics/:topicId/taught': {
    names: 'inAddress',
    request: () => ({ body: { taughtOn: '2026-02-02' } }),
    passes: { own: WORKS, other: LEADS },
    refused: { other: TEACHES },
    passStatus: 204,
  },

  'GET /questions': {
    ...inSubject,
    names: 'inRequest',
    request: ({ subjectId }) => ({ path: `/questions?subjectId=${subjectId}` }),
  },
  'POST /questions': {
    ...inSubject,
    names: 'inRequest',
    request: ({ subjectId, topicId }) => ({
      body: {
        ...draft,
        id: randomUUID(),
        subjectId,
        topicIds: [topicId],
        body: aNumberBody(),
      } satisfies CreateQuestion,
    }),
    passStatus: 201,
  },
  'GET /questions/:id': { ...anyQuestion, status: 'draft' },
  'PUT /questions/:id/draft': {
    ...ownDraft,
    request: ({ topicId }) => ({
      body: { ...draft, revision: 1, topicIds: [topicId], body: aNumberBody('Changed.') } satisfies SaveDraft,
    }),
  },
  'DELETE /questions/:id/draft': { ...ownDraft, request: revision, passStatus: 204 },
  'POST /questions/:id/send': { ...ownDraft, request: revision },
  // Nobody puts their own live, heads of department included.
  'POST /questions/:id/live': {
    names: 'inAddress',
    status: 'inReview',
    request: revision,
    passes: { other: WORKS },
    refused: { own: WORKS },
  },
  'POST /questions/:id/return': {
    ...anyQuestion,
    status: 'inReview',
    request: () => ({ body: { revision: 1, comment: 'Say which unit.' } }),
  },
  'POST /questions/:id/versions': { ...anyQuestion, status: 'live', request: nothing },
  'POST /questions/:id/retire': { ...ownDraft, status: 'live', request: nothing },
  'GET /questions/:id/classes': { ...anyQuestion, status: 'live' },
  'PUT /questions/:id/classes/:classId': {
    names: 'inAddress',
    status: 'live',
    request: () => ({ body: { choice: 'set' } }),
    passes: { own: WORKS, other: LEADS },
    refused: { other: TEACHES },
  },
  'GET /review-queue': { passes: { own: WORKS } },
  'GET /estimates': { passes: { own: ['headOfDepartment', 'headOfYear', 'schoolAdmin', 'multiRole'] } },
  'GET /item-statistics': {
    ...inSubject,
    names: 'inRequest',
    request: ({ subjectId }) => ({ path: `/item-statistics?subjectId=${subjectId}` }),
  },
};

/** Places that a route is asked for: all where it names a thing, else the one that stands for the route. */
export const placesOf = ({ names = 'nothing' }: Expectation): Place[] =>
  names === 'nothing' ? ['own'] : ['own', 'other', 'otherSubject', 'elsewhere', 'unknown'];

/** The status a person must get for a thing of a place. */
export function expectedStatus(expectation: Expectation, who: Who, place: Place): number {
  const { names = 'nothing', passes = {}, refused = {}, passStatus = 200 } = expectation;
  if (who === 'nobody' || who === 'disabled') return 401;
  if (passes[place]?.includes(who)) return passStatus;
  if (refused[place]?.includes(who)) return 403;
  if (names === 'inAddress') return 404;
  // Without any business there they are turned away before the thing is looked for.
  const hasBusiness = Object.values(passes).some((people) => people.includes(who));
  return names === 'inRequest' && hasBusiness ? 404 : 403;
}
