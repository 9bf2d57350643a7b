import { aMemory, anAnswerGiven } from '#seeds/factories/answer.ts';
import { aClass, aSitting, aSubject, aTopic, type FactorySubject, taught } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aStudent, aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import type { QuestionBody } from '#shared/schemas/question-body.ts';

/** Two parts with fractions and an integral in them, one marked by Plait and one by its student. */
export const MATHS: QuestionBody = {
  stem: 'A curve is $y = \\frac{x^2 - 4x + 3}{\\sqrt{x + 5}}$.\n\n$$\\int_0^4 \\left(x^2 - 4x + 3\\right)\\,\\mathrm{d}x$$',
  parts: [
    {
      prompt: 'Work out $y$ when $x = 4$.',
      lines: 3,
      answerLabel: '$y =$',
      answer: { kind: 'number', value: 1 },
      points: [
        { code: 'M', text: '$\\frac{16 - 16 + 3}{3}$', marks: 1 },
        { code: 'A', text: '$1$', marks: 1, allow: ['$\\frac{3}{3}$'] },
      ],
      modelAnswer: '1',
    },
    {
      prompt: 'Name the curve’s *other* property.',
      lines: 4,
      answer: { kind: 'selfMarked' },
      points: [
        { code: 'B', text: 'it crosses the axis twice', marks: 1, ignore: ['where'], reject: ['once'] },
        { code: 'B', text: 'at $x = 1$ and $x = 3$', marks: 1 },
      ],
      modelAnswer: 'It crosses the axis at 1 and 3.',
    },
  ],
};

export interface SchoolInUse {
  school: FactorySchool;
  subjects: FactorySubject[];
  teacher: FactoryPerson;
  colleague: FactoryPerson;
  head: FactoryPerson;
  student: FactoryPerson;
}

/** Three subjects with papers ahead, memory of some topics, and questions in every state. */
export async function aSchoolInUse(): Promise<SchoolInUse> {
  const school = await aSchool();
  const names = [
    { name: 'Mathematics', strand: 'ma' },
    { name: 'French', strand: 'fr' },
    { name: 'Physics', strand: 'ph' },
  ];
  const student = await aStudent(school);
  const subjects: FactorySubject[] = [];
  let staff: Pick<SchoolInUse, 'teacher' | 'colleague' | 'head'> | undefined;
  const day = new Date().toISOString().slice(0, 10);
  for (const [index, values] of names.entries()) {
    const subject = await aSubject(school, values);
    subjects.push(subject);
    const teacher = await aTeacher(school, subject.id);
    const colleague = await aTeacher(school, subject.id);
    staff ??= { teacher, colleague, head: await aHeadOfDepartment(school, subject.id) };
    const { id: classId } = await aClass(school, subject, { teachers: [teacher], students: [student] });
    await aSitting(school, subject, { on: addDays(day, 20 + index) });
    for (let n = 1; n <= 3; n++) {
      const topic = await aTopic(school, subject, { title: `${values.name} topic ${n}`, number: String(n) });
      if (n < 3) await taught(school, classId, topic.id);
      const at = { author: teacher, topicId: topic.id };
      const body = n === 1 ? MATHS : aRecallBody(`State fact ${n} of ${values.name}.`);
      const question = await aQuestion(school, subject, { ...at, body, kind: n === 1 ? 'shortAnswer' : 'recallCard' });
      await aQuestion(school, subject, { ...at, body: aNumberBody(`Work out item ${n} of ${values.name}.`) });
      await aQuestion(school, subject, { ...at, status: 'inReview', body });
      await aQuestion(school, subject, { ...at, status: 'draft', body });
      await anAnswerGiven(school, subject, { student, question, topicId: topic.id, marks: [1], maxMarks: 4 });
      await aMemory(school, student, question.id, {
        stability: [2, 12, 90][n - 1] ?? 1,
        lastOn: addDays(day, -15),
        lastShare: 0.25,
      });
    }
  }
  if (!staff) throw new Error('no subject was made');
  return { school, subjects, student, ...staff };
}
