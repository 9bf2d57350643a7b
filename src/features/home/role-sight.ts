import type { Role } from '#shared/schemas/role.ts';

interface Sight {
  will: string[];
  willNot: string[];
}

/** What a role without pages of its own so far will see here, and what it never does. */
export const roleSight: Partial<Record<Role, Sight>> = {
  headOfYear: {
    will: [
      'Minutes planned and minutes done by each student of your year group',
      'The standing of each of their topics, with their next papers',
      'Messages to their carers, which you write and send',
    ],
    willNot: ['What a student answered, or their working', 'How sure a student said they were', 'Other year groups'],
  },
  carer: {
    will: [
      'Minutes planned and minutes done by your child, week by week',
      'The standing of each of their topics',
      'When their papers are',
    ],
    willNot: ['What your child answered, or their working', 'How sure they said they were', 'Any other student'],
  },
  schoolAdmin: {
    will: [
      'Class lists, the exam timetable and term dates, and how they come in',
      'Accounts, and the audit log of who did what',
      'Export and erasure of a person’s data',
    ],
    willNot: [
      'What a student answered, or their working',
      'The standing of a student’s topics',
      'Questions and item statistics',
    ],
  },
  tutor: {
    will: ['Minutes planned and minutes done by your tutor group', 'The standing of each of their topics'],
    willNot: ['What a student answered, or their working', 'How sure a student said they were'],
  },
  senco: {
    will: ['Access arrangements: extra time and rest breaks, student by student'],
    willNot: ['What a student answered, or their working'],
  },
};
