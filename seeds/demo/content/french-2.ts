import { part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const holidays: TopicContent = {
  number: '4',
  title: 'Holidays and travel',
  weights: { 1: 8, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these holiday phrases into English.',
      parts: [
        part({
          prompt: '*à l’étranger*',
          answer: {
            kind: 'text',
            accept: [
              'abroad',
              'in a foreign country',
              'overseas',
              'to a foreign country',
              'in foreign countries',
              'in another country',
              'to another country',
            ],
            reject: ['a foreigner', 'foreigner', 'the stranger', 'strange', 'stranger', 'to the stranger'],
            unlisted: 'selfMark',
          },
          model: 'abroad',
          points: [point('abroad', { allow: ['overseas'], reject: ['a stranger'] })],
        }),
        part({
          prompt: '*faire la grasse matinée*',
          answer: {
            kind: 'text',
            accept: [
              'to have a lie-in',
              'to have a lie in',
              'have a lie-in',
              'have a lie in',
              'to lie in',
              'lie in',
              'a lie-in',
              'to sleep in',
              'sleep in',
              'to sleep late',
              'to stay in bed late',
              'to get up late',
              'having a lie-in',
            ],
            reject: ['a fat morning', 'to have a fat morning', 'to make the fat morning', 'to get up early'],
            unlisted: 'selfMark',
          },
          model: 'to have a lie-in',
          points: [point('to have a lie-in', { allow: ['to sleep late'], reject: ['a fat morning'] })],
        }),
        part({
          prompt: '*au bord de la mer*',
          answer: {
            kind: 'text',
            accept: [
              'at the seaside',
              'by the sea',
              'at the seashore',
              'beside the sea',
              'to the seaside',
              'the seaside',
              'seaside',
              'on the coast',
              'by the seaside',
              'at the edge of the sea',
              'next to the sea',
              'at the beach',
            ],
            reject: ['on board', 'the mother', 'in the sea', 'on the sea'],
            unlisted: 'selfMark',
          },
          model: 'at the seaside',
          points: [point('at the seaside', { allow: ['by the sea'], reject: ['on board'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 90,
      stem: 'Complete each sentence with *à*, *en*, *au* or *aux*.',
      parts: [
        part({
          prompt: '*Je vais* ______ *France.*',
          answer: exactly(['en'], ['à', 'a', 'au', 'aux', 'à la', 'un', 'de']),
          model: 'en',
          points: ['*en*'],
        }),
        part({
          prompt: '*Je vais* ______ *Portugal.*',
          answer: exactly(['au'], ['à', 'a', 'en', 'aux', 'à le', 'du']),
          model: 'au',
          points: ['*au*'],
        }),
        part({
          prompt: '*Je vais* ______ *États-Unis.*',
          answer: exactly(['aux'], ['à', 'a', 'en', 'au', 'à les']),
          model: 'aux',
          points: [point('*aux*', { reject: ['*à les*'] })],
        }),
        part({
          prompt: '*Je vais* ______ *Paris.*',
          answer: exactly(['à'], ['a', 'en', 'au', 'aux', 'de', 'á', 'â']),
          model: 'à',
          points: [point('*à*', { reject: ['*a*, with no accent'] })],
        }),
      ],
      guidance: 'Feminine countries take *en*, masculine ones *au*, plural ones *aux*, and towns *à*.',
    }),
    shortParts({
      seconds: 75,
      stem: 'Translate these ways of travelling into French.',
      parts: [
        part({
          prompt: 'by plane',
          answer: exactly(['en avion', 'par avion'], ['à avion', 'en avions']),
          model: 'en avion',
          points: [point('*en avion*', { allow: ['*par avion*'] })],
        }),
        part({
          prompt: 'on foot',
          answer: exactly(['à pied'], ['en pied', 'à pieds', 'au pied', 'sur pied']),
          model: 'à pied',
          points: [point('*à pied*', { reject: ['*en pied*', '*à pieds*'] })],
        }),
        part({
          prompt: 'by boat',
          answer: exactly(['en bateau', 'par bateau'], ['à bateau', 'en bateaux', 'au bateau', 'en gâteau']),
          model: 'en bateau',
          points: ['*en bateau*'],
        }),
      ],
    }),
    recall({
      seconds: 160,
      lines: 6,
      stem: `Translate into English.

> *L’été dernier, j’ai passé deux semaines au bord de la mer. Il faisait chaud et j’ai nagé tous les jours. L’année prochaine, nous irons à la montagne.*`,
      points: [
        point('Last summer I spent two weeks at the seaside', {
          allow: ['by the sea', 'a fortnight'],
          reject: ['I passed two weeks'],
        }),
        point('It was hot', { allow: ['warm'], reject: ['“it made hot”'] }),
        point('and I swam every day', { reject: ['all the day'] }),
        point('Next year we will go to the mountains', { allow: ['we are going to go'], reject: ['we went'] }),
      ],
      model:
        'Last summer I spent two weeks at the seaside. It was hot and I swam every day. Next year we will go to the mountains.',
      guidance: '*Tous les jours* is *every day*; *toute la journée* is *all day*. *Irons* is the future of *aller*.',
    }),
    recall({
      seconds: 170,
      lines: 8,
      stem: 'Write four sentences in French about a past holiday. Say where you went, how you travelled, what you did, and what it was like.',
      points: [
        point('Where: a correct perfect tense, such as *Je suis allé(e) en Espagne*', { reject: ['*J’ai allé*'] }),
        point('How: a correct means of travel, such as *J’ai voyagé en train*', { allow: ['*On a pris le train*'] }),
        point('What you did: another correct perfect tense, such as *J’ai visité un château*', {
          reject: ['present tense'],
        }),
        point('Opinion in the past, such as *C’était génial*', { reject: ['*C’est génial*'] }),
      ],
      model:
        'L’année dernière, je suis allé en Espagne avec ma famille. Nous avons voyagé en train. J’ai visité un vieux château et j’ai nagé dans la mer. C’était génial.',
    }),
  ],
};

const food: TopicContent = {
  number: '5',
  title: 'Food, health and lifestyle',
  weights: { 1: 6, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these words about food and health into English.',
      parts: [
        part({
          prompt: '*les légumes*',
          answer: exactly(
            ['vegetables', 'the vegetables', 'vegetable', 'veg', 'veggies', 'greens'],
            ['legumes', 'fruit', 'beans', 'pulses'],
          ),
          model: 'vegetables',
          points: [point('vegetables', { reject: ['legumes'] })],
        }),
        part({
          prompt: '*le petit-déjeuner*',
          answer: exactly(['breakfast', 'the breakfast'], ['lunch', 'small lunch', 'little lunch', 'dinner', 'snack']),
          model: 'breakfast',
          points: [point('breakfast', { reject: ['lunch'] })],
        }),
        part({
          prompt: '*malsain*',
          answer: {
            kind: 'text',
            accept: [
              'unhealthy',
              'not healthy',
              'bad for you',
              'bad for your health',
              'bad for the health',
              'not good for you',
              'not good for your health',
              'unwholesome',
            ],
            reject: ['ill', 'sick', 'healthy', 'unwell', 'badly'],
            unlisted: 'selfMark',
          },
          model: 'unhealthy',
          points: [point('unhealthy', { reject: ['ill', 'healthy'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 85,
      stem: 'Complete each sentence with *du*, *de la*, *de l’*, *des* or *de*.',
      parts: [
        part({
          prompt: '*Je bois* ______ *eau.*',
          answer: exactly(["de l'", "de l'eau", 'de l'], ['de la', 'du', 'des', "d'"]),
          model: "de l'",
          points: ['*de l’*'],
        }),
        part({
          prompt: '*Elle mange* ______ *viande.*',
          answer: exactly(['de la', 'de la viande'], ['du', 'des', "de l'", 'de le']),
          model: 'de la',
          points: ['*de la*'],
        }),
        part({
          prompt: '*Je ne mange pas* ______ *poisson.*',
          answer: exactly(['de', 'de poisson'], ['du', 'des', 'de la', "d'", 'le', 'du poisson']),
          model: 'de',
          points: [point('*de*', { reject: ['*du*'] })],
        }),
      ],
      guidance: 'After a negative such as *ne … pas*, the words *du, de la* and *des* become *de*.',
    }),
    shortParts({
      seconds: 70,
      stem: 'Translate these sentences into French.',
      parts: [
        part({
          prompt: 'I have a headache.',
          answer: {
            kind: 'text',
            accept: ["J'ai mal à la tête.", "J'ai un mal de tête.", 'Ma tête me fait mal.', 'La tête me fait mal.'],
            reject: ["J'ai mal au tête.", "J'ai mal à ma tête.", 'Je suis mal à la tête.', "J'ai mal la tête."],
            unlisted: 'selfMark',
          },
          model: "J'ai mal à la tête.",
          points: [
            point('*J’ai mal à la tête*', {
              allow: ['*J’ai un mal de tête*'],
              reject: ['*au tête*', '*à ma tête*', '*Je suis mal*'],
            }),
          ],
        }),
        part({
          prompt: 'I am hungry.',
          answer: {
            kind: 'text',
            accept: ["J'ai faim.", 'Je suis affamé.', 'Je suis affamée.'],
            reject: ['Je suis faim.', "J'ai soif.", "J'ai chaud.", "J'ai froid."],
            unlisted: 'selfMark',
          },
          model: "J'ai faim.",
          points: [point('*J’ai faim*', { reject: ['*Je suis faim*', '*J’ai fin*'] })],
        }),
      ],
      guidance: 'Aches, hunger and thirst use *avoir*: *j’ai mal*, *j’ai faim*, *j’ai soif*.',
    }),
    recall({
      seconds: 140,
      lines: 6,
      stem: `Translate into English.

> *Pour rester en forme, il faut dormir huit heures par nuit et boire beaucoup d’eau. Je n’ai jamais fumé.*`,
      points: [
        point('To stay fit', { allow: ['to keep in shape', 'in order to stay healthy'] }),
        point('you must sleep eight hours a night', {
          allow: ['it is necessary to', 'you have to, you need to', 'one must'],
        }),
        point('and drink a lot of water', { allow: ['lots of water', 'plenty of water'] }),
        point('I have never smoked', { allow: ['I never smoked'], reject: ['I never smoke', 'I do not smoke'] }),
      ],
      model: 'To stay fit, you must sleep eight hours a night and drink a lot of water. I have never smoked.',
    }),
    recall({
      seconds: 120,
      lines: 5,
      stem: 'Write three pieces of advice in French for someone who wants to be healthier. Use a different verb in each.',
      points: [
        point('First correct piece of advice, such as *Il faut manger des fruits*', {
          allow: ['*on doit*, *tu devrais*, or an imperative'],
        }),
        'Second correct piece of advice with a different verb, such as *Il faut boire de l’eau*',
        point('Third correct piece of advice with a different verb, such as *Il ne faut pas fumer*', {
          reject: ['a conjugated verb after *il faut*, such as *il faut mange*'],
        }),
      ],
      model:
        'Il faut manger des fruits et des légumes. On doit faire du sport trois fois par semaine. Il ne faut pas se coucher trop tard.',
    }),
  ],
};

const freeTime: TopicContent = {
  number: '6',
  title: 'Free time and media',
  weights: { 1: 6, 2: 4 },
  questions: [
    shortParts({
      seconds: 75,
      stem: 'Translate these words about free time into English.',
      parts: [
        part({
          prompt: '*un dessin animé*',
          answer: {
            kind: 'text',
            accept: [
              'a cartoon',
              'cartoon',
              'an animated film',
              'an animated cartoon',
              'animated film',
              'an animation',
              'animation',
              'an animated series',
              'an animated movie',
            ],
            reject: ['a comic book', 'a comic', 'a comic strip', 'a drawing', 'an animated drawing'],
            unlisted: 'selfMark',
          },
          model: 'a cartoon',
          points: [point('a cartoon', { allow: ['an animated film'], reject: ['a comic book'] })],
        }),
        part({
          prompt: '*les réseaux sociaux*',
          answer: words(
            'social networks',
            'the social networks',
            'social media',
            'social network',
            'social networking sites',
            'social networking',
          ),
          model: 'social networks',
          points: [point('social networks', { allow: ['social media'] })],
        }),
        part({
          prompt: '*télécharger*',
          answer: exactly(
            ['to download', 'download', 'downloading', 'to upload', 'upload'],
            ['to charge a phone', 'to telephone', 'to charge'],
          ),
          model: 'to download',
          points: [point('to download', { allow: ['to upload'], reject: ['to charge'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 85,
      stem: 'Complete each sentence with *au*, *du* or *de la*.',
      parts: [
        part({
          prompt: '*Je joue* ______ *guitare.*',
          answer: exactly(['de la', 'de la guitare'], ['du', 'au', 'à la']),
          model: 'de la',
          points: [point('*de la*', { reject: ['*à la*'] })],
        }),
        part({
          prompt: '*Il joue* ______ *foot.*',
          answer: exactly(['au', 'au foot'], ['du', 'de la', 'à', 'le', 'à le', 'aux']),
          model: 'au',
          points: [point('*au*', { reject: ['*du*'] })],
        }),
        part({
          prompt: '*Nous faisons* ______ *vélo.*',
          answer: exactly(['du', 'du vélo'], ['au', 'de la', 'de', 'le', 'de le', 'un', 'des']),
          model: 'du',
          points: ['*du*'],
        }),
      ],
      guidance: '*Jouer à* for sports and games, *jouer de* for instruments, *faire de* for activities.',
    }),
    shortParts({
      seconds: 120,
      stem: `Read what Mehdi says. Answer in English.

> *Le mercredi, je fais de l’escalade avec un club. Avant, je jouais du violon, mais j’ai arrêté l’année dernière parce que je n’avais pas assez de temps.*`,
      parts: [
        part({
          prompt: 'What does Mehdi do on Wednesdays?',
          answer: words(
            'climbing',
            'rock climbing',
            'he goes climbing',
            'goes climbing',
            'he goes rock climbing',
            'rock-climbing',
            'he climbs',
            'climbing with a club',
            'he does climbing',
            'climb',
            'climbs',
            'he goes to a climbing club',
          ),
          model: 'climbing',
          points: ['Climbing'],
        }),
        part({
          prompt: 'Which instrument did he use to play?',
          answer: exactly(['violin', 'the violin', 'fiddle'], ['cello', 'guitar', 'piano']),
          model: 'the violin',
          points: [point('The violin', { reject: ['viola'] })],
        }),
        part({
          prompt: 'Why did he stop?',
          answer: wording(
            'he did not have enough time',
            "he didn't have enough time",
            'not enough time',
            'he had not enough time',
            'lack of time',
            'he had no time',
            'he did not have time',
            "he didn't have time",
            "he didn't have much time",
          ),
          model: 'he did not have enough time',
          points: [point('He did not have enough time', { reject: ['bad weather', 'it was too expensive'] })],
        }),
      ],
    }),
    short({
      seconds: 60,
      stem: `Translate into French.

> I have been playing the piano for three years.`,
      answer: wording(
        'Je joue du piano depuis trois ans.',
        'Depuis trois ans, je joue du piano.',
        'Ça fait trois ans que je joue du piano.',
        'Je joue du piano depuis 3 ans.',
        'Cela fait trois ans que je joue du piano.',
        'Il y a trois ans que je joue du piano.',
      ),
      model: 'Je joue du piano depuis trois ans.',
      points: [
        point('*Je joue du piano*', { reject: ['*J’ai joué*', '*au piano*', '*le piano*'] }),
        point('*depuis trois ans*', { allow: ['*ça fait trois ans que*'], reject: ['*pour trois ans*'] }),
      ],
      guidance: 'The playing still goes on, so French uses the present tense with *depuis*.',
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Translate into French.

> I like watching films because it is relaxing, but I never go to the cinema. It is too expensive.`,
      points: [
        point('*J’aime regarder des films*', { allow: ['*les films*'], reject: ['*J’aime regarde*'] }),
        point('*parce que c’est relaxant*', { allow: ['*car*', '*reposant*', '*ça me détend*'] }),
        point('*mais je ne vais jamais au cinéma*', { reject: ['*à le cinéma*', '*je vais jamais*'] }),
        point('*C’est trop cher*', { allow: ['*Ça coûte trop cher*'], reject: ['*très cher*'] }),
      ],
      model: 'J’aime regarder des films parce que c’est relaxant, mais je ne vais jamais au cinéma. C’est trop cher.',
    }),
  ],
};

export const leisureTopics: TopicContent[] = [holidays, food, freeTime];
