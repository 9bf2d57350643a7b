import { part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const family: TopicContent = {
  number: '1',
  title: 'Family, friends and relationships',
  weights: { 1: 8, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these words about family into English.',
      parts: [
        part({
          prompt: '*mon frère aîné*',
          answer: words(
            'my older brother',
            'my elder brother',
            'older brother',
            'elder brother',
            'my eldest brother',
            'my oldest brother',
            'my big brother',
            'big brother',
          ),
          model: 'my older brother',
          points: [point('my older brother', { allow: ['elder, eldest'], reject: ['younger brother'] })],
        }),
        part({
          prompt: '*ma belle-mère*',
          answer: words(
            'my stepmother',
            'my step-mother',
            'my step mother',
            'stepmother',
            'step-mother',
            'my stepmum',
            'stepmum',
            'my mother-in-law',
            'mother-in-law',
            'my mother in law',
          ),
          model: 'my stepmother',
          points: [point('my stepmother', { allow: ['mother-in-law'], reject: ['beautiful mother', 'grandmother'] })],
        }),
        part({
          prompt: '*se disputer*',
          answer: words(
            'to argue',
            'argue',
            'to quarrel',
            'quarrel',
            'to have an argument',
            'to fall out',
            'to have a row',
            'to row',
            'to bicker',
            'arguing',
            'have an argument',
            'fall out',
            'have a row',
            'bicker',
            'to argue with each other',
            'to squabble',
          ),
          model: 'to argue',
          points: [point('to argue', { allow: ['to quarrel', 'to fall out'], reject: ['to dispute'] })],
        }),
      ],
    }),
    short({
      seconds: 60,
      stem: `Translate into French.

> I get on well with my sister.`,
      answer: wording(
        "Je m'entends bien avec ma sœur.",
        "Je m'entends bien avec ma soeur.",
        "J'ai de bons rapports avec ma sœur.",
        "J'ai une bonne relation avec ma sœur.",
        "J'ai de bonnes relations avec ma sœur.",
      ),
      model: "Je m'entends bien avec ma sœur.",
      points: [
        point('*Je m’entends bien*', {
          allow: ['*J’ai de bons rapports*'],
          reject: ['*J’entends bien* (I hear well)', '*Je m’entend*'],
        }),
        point('*avec ma sœur*', { reject: ['*mon sœur*'] }),
      ],
      guidance: '*S’entendre* is reflexive. Without *m’*, *j’entends* means *I hear*.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Write the adjective in brackets in the form that agrees.',
      parts: [
        part({
          prompt: '*Ma cousine est très* (gentil).',
          answer: exactly(['gentille'], ['gentil', 'gentile', 'gentilles', 'gentils']),
          model: 'gentille',
          points: [point('*gentille*', { reject: ['*gentile*'] })],
        }),
        part({
          prompt: '*Mes parents sont* (sévère).',
          answer: exactly(['sévères'], ['sévère', 'severe', 'sévére', 'sévèrent']),
          model: 'sévères',
          points: [point('*sévères*', { reject: ['*sévère*'] })],
        }),
        part({
          prompt: '*Ma tante est* (sportif).',
          answer: exactly(['sportive'], ['sportif', 'sportife', 'sportives', 'sportifs', 'sportiffe']),
          model: 'sportive',
          points: ['*sportive*'],
        }),
      ],
      guidance:
        'Find the noun first. *Cousine* and *tante* are feminine; *parents* is masculine plural. Adjectives in *-if* become *-ive*.',
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Translate into English.

> *Je m’entends bien avec mon demi-frère parce qu’il est drôle, mais il peut être paresseux. Le week-end dernier, nous sommes allés au cinéma ensemble.*`,
      points: [
        point('I get on well with my half-brother', { allow: ['stepbrother'] }),
        point('because he is funny', { reject: ['“he is droll”'] }),
        point('but he can be lazy', { reject: ['“he is lazy”'] }),
        point('Last weekend we went to the cinema together', {
          reject: ['present or future tense', 'omission of *together*'],
        }),
      ],
      model:
        'I get on well with my half-brother because he is funny, but he can be lazy. Last weekend we went to the cinema together.',
      guidance: '*Peut être*, two words, is *can be*. *Sommes allés* is perfect tense: *went*.',
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: 'Write three sentences in French about a friend. Say what they look like, what their personality is like, and something you do together.',
      points: [
        point('One correct detail of appearance, such as *Il est grand* or *Elle a les cheveux bruns*', {
          allow: ['minor errors that do not hide the meaning'],
        }),
        point('One correct detail of personality, with the adjective agreeing', {
          reject: ['an adjective that does not agree'],
        }),
        point('One thing done together, with a correct *nous* or *on* verb', {
          allow: ['*On joue au tennis ensemble*'],
        }),
      ],
      model:
        'Ma meilleure amie est petite et elle a les cheveux noirs. Elle est très généreuse. Le samedi, nous jouons au basket ensemble.',
    }),
  ],
};

const school: TopicContent = {
  number: '2',
  title: 'School and future plans',
  weights: { 1: 8, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these school words into English.',
      parts: [
        part({
          prompt: '*un emploi du temps*',
          answer: words(
            'timetable',
            'a timetable',
            'a school timetable',
            'schedule',
            'a schedule',
            'school timetable',
            'a time table',
            'time table',
          ),
          model: 'a timetable',
          points: [point('a timetable', { reject: ['a job', 'employment'] })],
        }),
        part({
          prompt: '*les devoirs*',
          answer: words('homework', 'the homework', 'homeworks'),
          model: 'homework',
          points: [point('homework', { reject: ['duties'] })],
        }),
        part({
          prompt: '*réussir un examen*',
          answer: {
            kind: 'text',
            accept: [
              'to pass an exam',
              'pass an exam',
              'to pass a test',
              'to succeed in an exam',
              'succeed in an exam',
              'to do well in an exam',
              'to be successful in an exam',
              'to pass an examination',
              'passing an exam',
              'to pass exams',
              'to pass your exam',
            ],
            reject: [
              'to take an exam',
              'to sit an exam',
              'to fail an exam',
              'to resit an exam',
              'to revise for an exam',
            ],
            unlisted: 'selfMark',
          },
          model: 'to pass an exam',
          points: [point('to pass an exam', { allow: ['to succeed in'], reject: ['to sit an exam'] })],
        }),
      ],
      guidance: '*Passer un examen* looks like *pass* but means to sit it. *Réussir* is the verb for passing.',
    }),
    shortParts({
      seconds: 70,
      stem: 'Translate these school words into French.',
      parts: [
        part({
          prompt: 'to learn',
          answer: exactly(['apprendre'], ['apprend', 'apprends', 'appris', 'enseigner', 'prendre', 'comprendre']),
          model: 'apprendre',
          points: ['*apprendre*'],
        }),
        part({
          prompt: 'break time',
          answer: words(
            'la récréation',
            'récréation',
            'la récré',
            'récré',
            'la pause',
            'une récréation',
            'la pause du matin',
            'pause',
          ),
          model: 'la récréation',
          points: [point('*la récréation*', { allow: ['*la récré*', '*la pause*'] })],
        }),
        part({
          prompt: 'a classroom',
          answer: exactly(
            ['une salle de classe', 'salle de classe', 'la salle de classe', 'une salle', 'une classe', 'la classe'],
            ['un salle de classe', 'un classe', 'une salle de class'],
          ),
          model: 'une salle de classe',
          points: [point('*une salle de classe*', { allow: ['*une classe*'], reject: ['*un salle de classe*'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 110,
      stem: `Read what Lucie says. Answer in English.

> *Au collège, je préfère les sciences parce que c’est utile, mais je trouve le dessin ennuyeux. Plus tard, je voudrais être infirmière.*`,
      parts: [
        part({
          prompt: 'Why does Lucie prefer science?',
          answer: words(
            'it is useful',
            "it's useful",
            'useful',
            'because it is useful',
            "because it's useful",
            'they are useful',
            'it is a useful subject',
            'science is useful',
          ),
          model: 'it is useful',
          points: [point('It is useful', { reject: ['it is interesting', 'it is easy'] })],
        }),
        part({
          prompt: 'Which subject does she find boring?',
          answer: words('art', 'arts', 'drawing', 'art lessons', 'sketching'),
          model: 'art',
          points: [point('Art', { allow: ['drawing'], reject: ['design'] })],
        }),
        part({
          prompt: 'What job would she like to do?',
          answer: words('nurse', 'a nurse', 'nursing', 'to be a nurse', 'be a nurse', 'female nurse'),
          model: 'nurse',
          points: [point('Nurse', { reject: ['doctor'] })],
        }),
      ],
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Translate into French.

> I have to wear a uniform. My favourite subject is maths because the teacher is funny.`,
      points: [
        point('*Je dois porter un uniforme*', { allow: ['*Il faut porter …*', '*Je suis obligé(e) de porter …*'] }),
        point('*Ma matière préférée*', { reject: ['*Mon matière préféré*'] }),
        point('*est les maths*', { allow: ['*ce sont les maths*', '*c’est les maths*', '*sont les maths*'] }),
        point('*parce que le professeur est drôle*', {
          allow: ['*la professeure*', '*le prof*', '*car*', '*amusant*', '*marrant*'],
        }),
      ],
      model: 'Je dois porter un uniforme. Ma matière préférée est les maths parce que le professeur est drôle.',
      guidance: '*Devoir* is followed by an infinitive. *Matière* is feminine, so *ma* and *préférée*.',
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Translate into English.

> *L’année prochaine, j’ai l’intention de continuer mes études. Ensuite, je voudrais faire un apprentissage, car je veux gagner de l’argent.*`,
      points: [
        point('Next year I intend to continue my studies', { allow: ['I plan to carry on with my studies'] }),
        point('Then I would like to do an apprenticeship', { allow: ['Afterwards', 'Next'], reject: ['I want to do'] }),
        point('because I want', { allow: ['as, since, for'], reject: ['“car” left as a vehicle'] }),
        point('to earn money', { allow: ['to make money'], reject: ['to win money'] }),
      ],
      model:
        'Next year I intend to continue my studies. Then I would like to do an apprenticeship, because I want to earn money.',
    }),
  ],
};

const town: TopicContent = {
  number: '3',
  title: 'Home, town and region',
  weights: { 1: 8, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these phrases about where you live into English.',
      parts: [
        part({
          prompt: '*la banlieue*',
          answer: words(
            'the suburbs',
            'suburbs',
            'the suburb',
            'suburb',
            'a suburb',
            'the outskirts',
            'outskirts',
            'suburbia',
            'the suburban area',
            'suburban areas',
            'the edge of town',
          ),
          model: 'the suburbs',
          points: [point('the suburbs', { allow: ['the outskirts'] })],
        }),
        part({
          prompt: '*un immeuble*',
          answer: {
            kind: 'text',
            accept: [
              'a block of flats',
              'block of flats',
              'an apartment block',
              'apartment block',
              'an apartment building',
              'apartment building',
              'a building',
              'building',
              'a block of apartments',
              'flats',
              'tower block',
              'a tower block',
            ],
            reject: ['a flat', 'an apartment', 'furniture', 'a piece of furniture', 'a house', 'immobile'],
            unlisted: 'selfMark',
          },
          model: 'a block of flats',
          points: [point('a block of flats', { allow: ['a building'], reject: ['a flat', 'furniture'] })],
        }),
        part({
          prompt: '*au rez-de-chaussée*',
          answer: exactly(
            [
              'on the ground floor',
              'ground floor',
              'the ground floor',
              'at ground level',
              'on ground floor',
              'downstairs',
              'on the bottom floor',
              'bottom floor',
            ],
            ['on the first floor', 'first floor', 'pavement', 'upstairs'],
          ),
          model: 'on the ground floor',
          points: [point('on the ground floor', { allow: ['downstairs'], reject: ['on the first floor'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 80,
      stem: 'Translate these phrases about places in a town into French.',
      parts: [
        part({
          prompt: 'opposite the station',
          answer: {
            kind: 'text',
            accept: ['en face de la gare', 'face à la gare'],
            reject: ['en face du gare', 'en face la gare', 'en face de gare'],
            unlisted: 'selfMark',
          },
          model: 'en face de la gare',
          points: [point('*en face de la gare*', { allow: ['*face à la gare*'], reject: ['*en face la gare*'] })],
        }),
        part({
          prompt: 'behind the church',
          answer: {
            kind: 'text',
            accept: ["derrière l'église"],
            reject: ["derrière de l'église", "devant l'église", "à côté de l'église"],
            unlisted: 'selfMark',
          },
          model: "derrière l'église",
          points: [
            point('*derrière l’église*', { reject: ['*derrière de l’église*', '*derrière la église*', '*devant*'] }),
          ],
        }),
        part({
          prompt: 'between the park and the river',
          answer: {
            kind: 'text',
            accept: [
              'entre le parc et la rivière',
              'entre le parc et le fleuve',
              'entre le jardin public et la rivière',
              'entre la rivière et le parc',
            ],
            reject: [
              'entre la parc et la rivière',
              'entre le parc et le rivière',
              'entre le parc est la rivière',
              'entre le parc et la fleuve',
            ],
            unlisted: 'selfMark',
          },
          model: 'entre le parc et la rivière',
          points: [
            point('*entre le parc et la rivière*', {
              allow: ['*le fleuve*'],
              reject: ['a wrong gender', '*est* for *et*'],
            }),
          ],
        }),
      ],
      guidance: '*En face de* keeps its *de*; *derrière* and *entre* are followed directly by the noun.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Complete each sentence with *du*, *de la*, *de l’* or *des*.',
      parts: [
        part({
          prompt: '*J’habite près* ______ *cinéma.*',
          answer: exactly(['du', 'du cinéma', 'près du'], ['de', 'des', 'de la', 'de le', "de l'"]),
          model: 'du',
          points: [point('*du*', { reject: ['*de le*'] })],
        }),
        part({
          prompt: '*Le musée est à côté* ______ *magasins.*',
          answer: exactly(['des', 'des magasins'], ['de', 'du', 'de la', 'de les', "de l'"]),
          model: 'des',
          points: [point('*des*', { reject: ['*de les*'] })],
        }),
        part({
          prompt: '*La poste est en face* ______ *hôtel de ville.*',
          answer: exactly(["de l'", "de l'hôtel de ville", 'de l'], ['du', 'de la', 'des', 'de le']),
          model: "de l'",
          points: [point('*de l’*', { reject: ['*du*'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 110,
      stem: `Read what Karim says. Answer in English.

> *Ma ville est petite mais animée. Il y a un marché le samedi et une nouvelle bibliothèque, mais il n’y a plus de piscine. C’est dommage !*`,
      parts: [
        part({
          prompt: 'What takes place on Saturdays?',
          answer: words('a market', 'market', 'the market', 'there is a market'),
          model: 'a market',
          points: ['A market'],
        }),
        part({
          prompt: 'Which building is new?',
          answer: exactly(['library', 'the library', 'a library'], ['bookshop', 'swimming pool', 'the bookshop']),
          model: 'the library',
          points: [point('The library', { reject: ['the bookshop'] })],
        }),
        part({
          prompt: 'What does the town no longer have?',
          answer: words('a swimming pool', 'swimming pool', 'the swimming pool', 'a pool', 'pool', 'swimming baths'),
          model: 'a swimming pool',
          points: ['A (swimming) pool'],
        }),
      ],
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Translate into French.

> There is a castle in my town. You can visit the museum. I would like to live in the countryside.`,
      points: [
        point('*Il y a un château*', { allow: ['a slip in the accent'] }),
        point('*dans ma ville*', { reject: ['*dans mon ville*'] }),
        point('*On peut visiter le musée*', {
          allow: ['*Tu peux …*', '*Vous pouvez …*', '*Il est possible de …*'],
          reject: ['*On peut visite*'],
        }),
        point('*Je voudrais habiter à la campagne*', { allow: ['*J’aimerais*', '*vivre*'], reject: ['*en campagne*'] }),
      ],
      model: 'Il y a un château dans ma ville. On peut visiter le musée. Je voudrais habiter à la campagne.',
    }),
  ],
};

export const homeTopics: TopicContent[] = [family, school, town];
