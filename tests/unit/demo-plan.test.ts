import { describe, expect, test } from 'vitest';
import { demoList } from '#seeds/demo/demo-people.ts';
import { HISTORY_OPTIONS } from '#seeds/demo/history-options.ts';
import { STUDENT_NAMES, usernameFor } from '#seeds/demo/names.ts';
import { isFor } from '#seeds/demo/papers.ts';
import { allBankRows, planDemo, planPractice, studyRows } from '#seeds/demo/plan.ts';
import { markPart } from '#shared/domain/marking/mark-part.ts';
import { foldLog } from '#shared/domain/schedule/fold.ts';
import { gradeOf } from '#shared/domain/schedule/grade.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { daysBetween, weekday } from '#shared/domain/time/calendar.ts';
import { localDate } from '#shared/domain/time/zone.ts';
import { signInPageSchema } from '#shared/schemas/auth.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import { markedPartSchema } from '#shared/schemas/marked-part.ts';
import { draftBodySchema } from '#shared/schemas/question.ts';
import { questionBodySchema } from '#shared/schemas/question-body.ts';
import { reasonSchema } from '#shared/schemas/reason.ts';

const TODAY = '2026-12-01';
const BUDGETS = { mixed: 1500, morning: 900 };
const plan = planDemo(TODAY);
const study = studyRows(plan, 'hash');
const bank = allBankRows(plan);
const practice = planPractice(plan, BUDGETS);

describe('the demo school', () => {
  test('has 180 students with names and usernames of their own', () => {
    expect(STUDENT_NAMES).toHaveLength(180);
    expect(new Set(study.users?.map(({ username }) => username)).size).toBe(study.users?.length);
    for (const name of STUDENT_NAMES) expect(usernameFor(name)).toMatch(/^[a-z]+(?:[.-][a-z]+)+$/);
  });

  test('has every student in one class of each subject, and a teacher for every class', () => {
    for (const student of plan.students) {
      const own = plan.classes.filter(({ students }) => students.includes(student));
      expect(own.map(({ subjectCode }) => subjectCode).sort()).toEqual(plan.subjects.map((s) => s.content.code).sort());
    }
    const staff = new Set(study.users?.map(({ id }) => id));
    for (const { teacherId } of plan.classes) expect(staff.has(teacherId)).toBe(true);
  });

  test('lets two mathematics classes of 28 practise', () => {
    expect(new Set(practice.sets.map(({ user_id }) => user_id)).size).toBe(56);
    expect(practice.answers.length).toBeGreaterThan(22_000);
    expect(practice.answers.length).toBeLessThan(40_000);
  });

  test.each(['2026-12-01', '2027-02-28', '2027-07-24', '2028-02-29'])('is always in its run-up: %s', (today) => {
    const { seasons, classes } = planDemo(today);
    const [mock, summer] = seasons;
    expect(daysBetween(today, mock?.startsOn ?? '')).toBeGreaterThanOrEqual(32);
    expect(daysBetween(today, mock?.startsOn ?? '')).toBeLessThanOrEqual(38);
    expect(daysBetween(mock?.startsOn ?? '', summer?.startsOn ?? '')).toBe(140);
    for (const { sittings, startsOn, endsOn } of seasons) {
      for (const { on } of sittings) expect(weekday(on) < 5 && on >= startsOn && on <= endsOn).toBe(true);
      for (const student of plan.students) {
        const papers = classes
          .filter(({ students }) => students.some(({ id }) => id === student.id))
          .flatMap(({ specification, entry }) => specification.papers.filter(isFor(entry)).map(({ id }) => id));
        const times = sittings
          .filter(({ paperId }) => papers.includes(paperId))
          .map(({ on, startsAt }) => on + startsAt);
        expect(times).toHaveLength(papers.length);
        expect(new Set(times).size).toBe(times.length);
      }
    }
  });

  test('has taught all but the last topics, on school days gone by', () => {
    for (const { taught, specification, entry } of plan.classes) {
      for (const day of taught.values())
        expect(day < TODAY && weekday(day) < 5 && daysBetween(day, TODAY) <= 470).toBe(true);
      const followed = specification.topics.filter(isFor(entry));
      expect([...taught.keys()]).toEqual(followed.slice(0, taught.size).map(({ id }) => id));
      expect(followed.length - taught.size).toBeGreaterThanOrEqual(1);
      expect(followed.length - taught.size).toBeLessThanOrEqual(2);
    }
  });

  test('sits both tiers and both options of a paper at one time', () => {
    for (const { sittings } of plan.seasons) {
      const timeOf = new Map(sittings.map(({ paperId, on, startsAt }) => [paperId, on + startsAt]));
      for (const { specifications } of plan.subjects) {
        for (const { papers } of specifications) {
          const times = papers.map(({ id, number }) => `${number} ${timeOf.get(id)}`);
          expect(new Set(times).size).toBe(new Set(papers.map(({ number }) => number)).size);
        }
      }
    }
  });

  test('enters every student for a tier where there are two, and for one option of history', () => {
    const entries = new Map(plan.classes.map(({ id, entry }) => [id, entry]));
    for (const { class_id, tier, option } of study.enrolments ?? []) {
      expect({ tier, option }).toEqual(entries.get(class_id ?? ''));
    }
    for (const { subjectCode, entry, specification } of plan.classes) {
      expect(entry.tier !== null).toBe(specification.papers.some(({ tier }) => tier));
      expect(entry.option !== null).toBe(subjectCode === 'HI');
    }
    const options = plan.classes.flatMap(({ entry }) => entry.option ?? []);
    expect([...new Set(options)].sort()).toEqual([...HISTORY_OPTIONS].sort());
  });

  test('puts topics, papers and questions of history under its options', () => {
    const topics = new Map(study.topics?.map(({ id, option }) => [id, option]));
    const options = new Set([...topics.values(), ...(study.papers ?? []).map(({ option }) => option)]);
    expect(options).toEqual(new Set([null, ...HISTORY_OPTIONS]));
    const versions = new Map(bank.question_versions?.map(({ id, option }) => [id, option]));
    for (const { question_version_id, topic_id } of bank.question_topics ?? []) {
      expect(versions.get(question_version_id)).toBe(topics.get(topic_id));
    }
    expect(new Set(bank.question_topics?.map((row) => row.question_version_id)).size).toBe(versions.size);
  });

  test('practises nothing that a student is not entered for', () => {
    const entered = new Map(
      plan.students.map((student) => {
        const own = plan.classes.filter(({ students }) => students.includes(student));
        return [student.id, own.flatMap(({ specification, entry }) => specification.topics.filter(isFor(entry)))];
      }),
    );
    const topicIds = new Map([...entered].map(([id, topics]) => [id, new Set(topics.map((topic) => topic.id))]));
    const papers = new Map(study.papers?.map((paper) => [paper.id, paper]));
    const options = new Map<string, Set<string>>();
    const owners = new Map(practice.sets.map(({ id, user_id }) => [id, user_id ?? '']));
    for (const { set_id, topic_id, reason } of practice.set_items) {
      const owner = owners.get(set_id) ?? '';
      expect(topicIds.get(owner)?.has(topic_id ?? '')).toBe(true);
      const parsed = reasonSchema.parse(reason);
      const option = 'paperId' in parsed && papers.get(parsed.paperId)?.option;
      if (option) options.set(owner, (options.get(owner) ?? new Set()).add(option));
    }
    for (const met of options.values()) expect(met.size).toBe(1);
  });

  test('has questions in draft, in review and live, none put live by its author', () => {
    for (const version of bank.question_versions ?? []) {
      expect(version.reviewer_id).not.toBe(version.author_id);
      const schema = version.status === 'draft' ? draftBodySchema : questionBodySchema;
      expect(schema.safeParse(version.body).success).toBe(true);
    }
    const statuses = new Set(bank.question_versions?.map(({ status }) => status));
    expect([...statuses].sort()).toEqual(['draft', 'inReview', 'live']);
  });

  test('is the same school when made again on the same day', () => {
    const again = planDemo(TODAY);
    expect(studyRows(again, 'hash')).toEqual(study);
    expect(allBankRows(again)).toEqual(bank);
    const ids = new Set([...new Set(practice.sets.map(({ user_id }) => user_id ?? ''))].slice(0, 3));
    const some = [...ids].flatMap((id) => again.students.filter((student) => student.id === id));
    const before = practice.answers.filter(({ user_id }) => ids.has(user_id ?? ''));
    expect(before.length).toBeGreaterThan(100);
    expect(planPractice(again, BUDGETS, some).answers).toEqual(before);
  }, 60_000);

  test('offers people who exist', () => {
    const { people } = demoList(plan.classes);
    expect(signInPageSchema.shape.demoPeople.safeParse(people).success).toBe(true);
    const known = new Map(study.users?.map(({ username, name }) => [username, name]));
    for (const { username, name } of people) expect(known.get(username)).toBe(name);
  });
});

function groupAnswers(): Map<string, typeof practice.answers> {
  const groups = new Map<string, typeof practice.answers>();
  for (const answer of practice.answers) {
    const key = `${answer.user_id} ${answer.question_id}`;
    groups.set(key, [...(groups.get(key) ?? []), answer]);
  }
  return groups;
}

describe('simulated practice', () => {
  const bodies = new Map(bank.question_versions?.map(({ id, body }) => [id, body]));
  const events = new Map(practice.mark_events.map((event) => [event.answer_id, event]));
  const items = new Map(practice.set_items.map((item) => [item.id, item]));

  test('lies before the day of seeding, each answer within its day', () => {
    for (const { given_at, given_on } of practice.answers) {
      expect(localDate(new Date(given_at ?? ''), 'Europe/London')).toBe(given_on);
      expect((given_on ?? '') < TODAY).toBe(true);
    }
    for (const { finished_at, set_on } of practice.sets) {
      expect(localDate(new Date(finished_at ?? ''), 'Europe/London')).toBe(set_on);
    }
  });

  test('is marked as Plait marks it', () => {
    const wrong = practice.answers.filter(({ id, question_version_id, responses }) => {
      const { parts } = questionBodySchema.parse(bodies.get(question_version_id));
      const event = events.get(id);
      const marked = markedPartSchema.array().parse(event?.parts);
      const typed = responses as string[];
      const isAgreed = parts.every((part, index) => {
        const verdict = markPart(part, typed[index] ?? '');
        const by = verdict.outcome === 'undecided' ? 'student' : 'plait';
        return (
          marked[index]?.markedBy === by &&
          verdict.earned.every((own, at) => own === null || own === marked[index]?.earned[at])
        );
      });
      const sum = parts.reduce(
        (marks, part, index) =>
          marks + part.points.reduce((all, point, at) => all + (marked[index]?.earned[at] ? point.marks : 0), 0),
        0,
      );
      return !isAgreed || sum !== event?.marks;
    });
    expect(wrong).toEqual([]);
  }, 60_000);

  test('leaves the memory that its log folds to', () => {
    const logs = groupAnswers();
    expect(practice.memory_states).toHaveLength(logs.size);
    for (const state of practice.memory_states) {
      const folded = foldLog(
        (logs.get(`${state.user_id} ${state.question_id}`) ?? []).map(
          ({ id, set_item_id, given_at, given_on, how_sure }) => {
            const { marks, max_marks } = events.get(id) ?? { marks: null, max_marks: null };
            const grade = gradeOf({ marks: marks ?? 0, maxMarks: max_marks ?? 0, howSure: how_sure as HowSure });
            const { prior_recall: recall, prior_days: days } = items.get(set_item_id) ?? {};
            const prior = recall && days ? { recall, days } : null;
            return { answerId: id ?? '', givenAt: new Date(given_at ?? ''), givenOn: given_on ?? '', grade, prior };
          },
        ),
        DEFAULT_MODEL,
      );
      const { memory, ...counts } = folded;
      expect({ ...memory, ...counts }).toEqual({
        stability: state.stability,
        difficulty: state.difficulty,
        lastOn: state.last_on,
        attempts: state.attempts,
        firstGrade: state.first_grade,
        lastGrade: state.last_grade,
      });
    }
  });

  test('says why each question was chosen', () => {
    for (const { reason } of practice.set_items) expect(reasonSchema.safeParse(reason).success).toBe(true);
  });
});
