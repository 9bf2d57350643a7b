import { aClass, aSubject, aTopic, type FactorySubject, taught } from './curriculum.ts';
import { aStudent, aTeacher, type FactoryPerson } from './people.ts';
import { aNumberBody, aQuestion, aRecallBody } from './question.ts';
import { aSchool, type FactorySchool } from './school.ts';

/** A school where one student can practise: subjects, topics taught, live questions, a teacher each. */
export interface Study {
  school: FactorySchool;
  student: FactoryPerson;
  subjects: (FactorySubject & { teacher: FactoryPerson; classId: string; topicIds: string[] })[];
}

/** `questions` a topic: all of them numbers but the last, which is a recall card. */
export async function aStudy(
  sizes: Partial<{ subjects: number; topics: number; questions: number }> = {},
): Promise<Study> {
  const { subjects: subjectCount = 2, topics = 2, questions = 3 } = sizes;
  const school = await aSchool();
  const student = await aStudent(school);
  const subjects: Study['subjects'] = [];
  for (let s = 0; s < subjectCount; s++) {
    const subject = await aSubject(school);
    const teacher = await aTeacher(school, subject.id);
    const { id: classId } = await aClass(school, subject, { teachers: [teacher], students: [student] });
    const topicIds: string[] = [];
    for (let t = 0; t < topics; t++) {
      const topic = await aTopic(school, subject);
      topicIds.push(topic.id);
      await taught(school, classId, topic.id);
      for (let q = 0; q < questions; q++) {
        const isCard = q === questions - 1;
        await aQuestion(school, subject, {
          author: teacher,
          topicId: topic.id,
          kind: isCard ? 'recallCard' : 'shortAnswer',
          body: isCard
            ? aRecallBody(`State fact ${q} of ${topic.title}.`)
            : aNumberBody(`Work out item ${q} of ${topic.title}.`),
        });
      }
    }
    subjects.push({ ...subject, teacher, classId, topicIds });
  }
  return { school, student, subjects };
}
