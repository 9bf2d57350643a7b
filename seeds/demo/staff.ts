/** A department of the demo school: who leads it, who teaches in it, and which subjects it has. */
export interface Department {
  subjectCodes: string[];
  head: string;
  teachers: string[];
}

export const DEPARTMENTS: Department[] = [
  {
    subjectCodes: ['EN', 'EL'],
    head: 'Ms F. Penderry',
    teachers: ['Mr A. Rashid', 'Mrs T. Loxley', 'Ms J. Akande', 'Mr S. Whitcombe'],
  },
  {
    subjectCodes: ['MA'],
    head: 'Dr O. Adeyinka',
    teachers: ['Ms C. Hallworth', 'Mr J. Bidwell', 'Mrs P. Sundaram', 'Mr D. Kowalczyk'],
  },
  { subjectCodes: ['BI'], head: 'Mrs K. Ainscough', teachers: ['Mr R. Bhandari', 'Ms E. Trevanion'] },
  { subjectCodes: ['CH'], head: 'Mr H. Osei-Bonsu', teachers: ['Ms M. Delacourt', 'Mr I. Thornley'] },
  { subjectCodes: ['PH'], head: 'Dr S. Varga', teachers: ['Mr L. Meakin', 'Ms Y. Tanaka'] },
  { subjectCodes: ['GE'], head: 'Mr P. Arkless', teachers: ['Mrs N. Chowdhury', 'Ms B. Garrity'] },
  { subjectCodes: ['HI'], head: 'Ms V. Hindle', teachers: ['Mr T. Makinde', 'Mrs A. Stroud'] },
  { subjectCodes: ['FR'], head: 'Ms C. Besson', teachers: ['Mr G. Lavelle', 'Mrs R. Anyanwu'] },
];

export const HEAD_OF_YEAR = 'Mr W. Pascoe';
export const SCHOOL_ADMIN = 'Mrs D. Kirkbride';
export const SENCO = 'Ms H. Rostami';

/** Tutor group → its tutor, one of the teachers. */
export const TUTOR_GROUPS: [group: string, tutor: string][] = [
  ['11A', 'Mr A. Rashid'],
  ['11E', 'Mr J. Bidwell'],
  ['11L', 'Ms E. Trevanion'],
  ['11M', 'Ms M. Delacourt'],
  ['11R', 'Mrs N. Chowdhury'],
  ['11S', 'Mr T. Makinde'],
  ['11W', 'Mr G. Lavelle'],
];

const departmentOf = (subjectCode: string): Department => {
  const found = DEPARTMENTS.find(({ subjectCodes }) => subjectCodes.includes(subjectCode));
  if (!found) throw new Error(`No department teaches ${subjectCode}.`);
  return found;
};

/** Everybody who teaches a subject, its head of department first. */
export function teachersOf(subjectCode: string): string[] {
  const { head, teachers } = departmentOf(subjectCode);
  return [head, ...teachers];
}
