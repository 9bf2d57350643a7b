/** By subject code, pairs of topics (by number) that students mix up and that are worth asking one after the other. */
export const CONFUSABLE: Record<string, [string, string][]> = {
  // Sentence forms and the punctuation between them; word classes and the techniques built on them.
  EN: [
    ['9', '10'],
    ['2', '3'],
  ],
  // Which poem belongs to which group.
  EL: [['9', '10']],
  // Percentages of and in ratios; which length a triangle gives; index laws and quadratics.
  MA: [
    ['2', '7'],
    ['8', '9'],
    ['3', '5'],
  ],
  // Mitosis and meiosis.
  BI: [['2', '9']],
  // Energy profiles and rates; moles of solids and of solutions.
  CH: [
    ['6', '7'],
    ['3', '4'],
  ],
  // Forces and the motion that they cause; circuits and the mains.
  PH: [
    ['6', '7'],
    ['2', '3'],
  ],
  // Responses to the two kinds of hazard; river and coastal processes.
  GE: [
    ['1', '2'],
    ['4', '5'],
  ],
  // Which century of medicine; the republic's troubles and the rise of Hitler.
  HI: [
    ['1', '2'],
    ['10', '11'],
  ],
  // Past tenses against future and conditional.
  FR: [['9', '10']],
};
