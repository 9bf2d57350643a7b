import { part, point, recall, shortParts, type TopicContent, words } from './build.ts';
import { exactly } from './exact-words.ts';

const past: TopicContent = {
  number: '9',
  title: 'Past tenses',
  weights: { 1: 4, 2: 10 },
  questions: [
    shortParts({
      seconds: 110,
      stem: 'Write each verb in the perfect tense. Begin with the pronoun given.',
      parts: [
        part({
          prompt: '*je* (regarder)',
          answer: exactly(
            ["j'ai regardé"],
            ["j'ai regarder", 'je regardé', 'je suis regardé', "j'ai regarde", "j'ai regardée", 'je regardais'],
          ),
          model: "j'ai regardé",
          points: [point('*j’ai regardé*', { reject: ['*j’ai regarder*', '*je ai regardé*'] })],
        }),
        part({
          prompt: '*elle* (aller)',
          answer: exactly(
            ['elle est allée'],
            [
              'elle est allé',
              'elle a allé',
              'elle a allée',
              'elle est aller',
              'elle est allés',
              'elles sont allées',
              'elle es allée',
            ],
          ),
          model: 'elle est allée',
          points: [point('*elle est allée*', { reject: ['*elle a allé*', '*elle est allé*'] })],
        }),
        part({
          prompt: '*nous* (prendre)',
          answer: exactly(
            ['nous avons pris'],
            [
              'nous avons prendu',
              'nous avons prends',
              'nous sommes pris',
              'nous avons prit',
              'nous avons prie',
              'nous avions pris',
              'nous avons prix',
            ],
          ),
          model: 'nous avons pris',
          points: [point('*nous avons pris*', { reject: ['*prendu*'] })],
        }),
        part({
          prompt: '*ils* (venir)',
          answer: exactly(
            ['ils sont venus'],
            [
              'ils sont venu',
              'ils ont venu',
              'ils ont venus',
              'ils sont venues',
              'ils sont venir',
              'il est venu',
              'ils sont venis',
              'ils sont vendus',
            ],
          ),
          model: 'ils sont venus',
          points: [point('*ils sont venus*', { reject: ['*ils ont venu*', '*ils sont venu*'] })],
        }),
      ],
      guidance:
        'Verbs of movement such as *aller* and *venir* take *être*, and the past participle then agrees with the subject.',
    }),
    shortParts({
      seconds: 90,
      stem: 'Complete each sentence with the past participle of the verb in brackets.',
      parts: [
        part({
          prompt: '*J’ai* ______ *du thé.* (boire)',
          answer: exactly(
            ['bu', "j'ai bu"],
            ['boit', 'bois', 'boire', 'but', 'bus', 'boivu', 'lu', 'vu', 'bue', 'buvé', "j'ai vu", "j'ai lu"],
          ),
          model: 'bu',
          points: ['*bu*'],
        }),
        part({
          prompt: '*Tu as* ______ *ce livre ?* (lire)',
          answer: exactly(
            ['lu', 'tu as lu'],
            ['lit', 'lis', 'lire', 'li', 'lus', 'bu', 'vu', 'lue', 'tu as vu', 'tu as bu'],
          ),
          model: 'lu',
          points: ['*lu*'],
        }),
        part({
          prompt: '*Il a* ______ *la table.* (mettre)',
          answer: exactly(
            ['mis', 'il a mis'],
            ['met', 'mets', 'metté', 'mit', 'mettu', 'mi', 'mise', 'mettre', 'mais', 'il a mit'],
          ),
          model: 'mis',
          points: [point('*mis*', { reject: ['*metté*'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 80,
      stem: 'Write each verb in the imperfect tense. Begin with the pronoun given.',
      parts: [
        part({
          prompt: '*je* (être)',
          answer: exactly(["j'étais"], ["j'était", "j'ai été", "j'etes", "j'avais"]),
          model: "j'étais",
          points: [point('*j’étais*', { reject: ['*j’était*', '*je étais*'] })],
        }),
        part({
          prompt: '*il* (faire)',
          answer: exactly(
            ['il faisait'],
            ['il faisais', 'il faissait', 'il fesait', 'il faisaient', 'il fait', 'il a fait', 'il faitait'],
          ),
          model: 'il faisait',
          points: [point('*il faisait*', { reject: ['*il faisais*'] })],
        }),
        part({
          prompt: '*nous* (avoir)',
          answer: exactly(
            ['nous avions'],
            ['nous avons', 'nous aurions', 'nous aviez', 'nous avion', 'nous avaions', 'nous étions', 'nous allions'],
          ),
          model: 'nous avions',
          points: [point('*nous avions*', { reject: ['*nous avons*'] })],
        }),
      ],
      guidance:
        'The stem is the *nous* form of the present without *-ons* (*fais-*, *av-*). *Être* alone is irregular: *ét-*.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Explain when French uses the perfect tense and when it uses the imperfect. Give two uses of the imperfect.',
      points: [
        point('Perfect: a single or completed action in the past', { allow: ['*j’ai mangé*, I ate or have eaten'] }),
        point('Imperfect: a repeated action or habit in the past', { allow: ['*used to*'] }),
        point('Imperfect: description, or what was going on', {
          allow: ['*was doing*', 'weather, feelings, opinions in the past'],
        }),
      ],
      model:
        'The perfect is used for a completed action in the past, such as j’ai mangé. The imperfect is used for something that used to happen repeatedly, such as je jouais tous les jours, and for description or what was going on, such as il faisait froid.',
    }),
    recall({
      seconds: 160,
      lines: 6,
      stem: `Translate into French.

> Yesterday I went to the beach with my friends. We ate ice creams. It was great.`,
      points: [
        point('*Hier, je suis allé(e)*', { reject: ['*j’ai allé*'] }),
        point('*à la plage avec mes amis*', {
          allow: ['*mes copains*', '*mes amies*', '*mes copines*'],
          reject: ['*au plage*'],
        }),
        point('*Nous avons mangé des glaces*', { allow: ['*On a mangé des glaces*'] }),
        point('*C’était génial*', { allow: ['*super*, *formidable*, *fantastique*'], reject: ['*C’est*'] }),
      ],
      model: 'Hier, je suis allée à la plage avec mes amis. Nous avons mangé des glaces. C’était génial.',
    }),
  ],
};

const future: TopicContent = {
  number: '10',
  title: 'Future and conditional',
  weights: { 1: 3, 2: 6 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Translate into French, using the near future (*aller* and an infinitive).',
      parts: [
        part({
          prompt: 'I am going to travel.',
          answer: {
            kind: 'text',
            accept: ['Je vais voyager.', 'Je vais faire un voyage.', 'Je vais partir en voyage.'],
            reject: [
              'Je vais voyage.',
              'Je vais voyagé.',
              'Je vas voyager.',
              'Je vais à voyager.',
              'Je suis voyager.',
              'Je fais voyager.',
              'Je voyagerai.',
            ],
            unlisted: 'selfMark',
          },
          model: 'Je vais voyager.',
          points: [point('*Je vais voyager*', { allow: ['*Je vais faire un voyage*'], reject: ['*Je vais voyage*'] })],
        }),
        part({
          prompt: 'We are going to eat. (Use *nous*.)',
          answer: exactly(
            ['Nous allons manger.'],
            [
              'Nous allons mange.',
              'Nous allons mangé.',
              'Nous allons mangeons.',
              'Nous allez manger.',
              'Nous aimons manger.',
              'Nous mangerons.',
              'Nous avons mangé.',
            ],
          ),
          model: 'Nous allons manger.',
          points: [point('*Nous allons manger*', { reject: ['*Nous allons mangeons*'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 100,
      stem: 'Write each verb in the simple future. Begin with the pronoun given.',
      parts: [
        part({
          prompt: '*je* (finir)',
          answer: exactly(
            ['je finirai'],
            ['je finirais', 'je finira', 'je finisserai', 'je vais finir', 'je finiras', 'je finerai'],
          ),
          model: 'je finirai',
          points: [point('*je finirai*', { reject: ['*je finirais*, which is conditional'] })],
        }),
        part({
          prompt: '*il* (être)',
          answer: exactly(
            ['il sera'],
            ['il serait', 'il serra', 'il êtra', 'il seras', 'il serai', 'il fera', 'il va être', 'il aura'],
          ),
          model: 'il sera',
          points: [point('*il sera*', { reject: ['*il serait*'] })],
        }),
        part({
          prompt: '*nous* (aller)',
          answer: exactly(
            ['nous irons'],
            ['nous irions', 'nous allerons', 'nous iront', 'nous aurons', 'nous allons', 'nous rions', 'nous lirons'],
          ),
          model: 'nous irons',
          points: [point('*nous irons*', { reject: ['*nous allerons*'] })],
        }),
        part({
          prompt: '*tu* (avoir)',
          answer: exactly(
            ['tu auras'],
            ['tu aurais', 'tu avoiras', 'tu aura', 'tu avras', 'tu iras', 'tu aurai', 'tu saurais', 'tu sauras'],
          ),
          model: 'tu auras',
          points: [point('*tu auras*', { reject: ['*tu avoiras*'] })],
        }),
      ],
      guidance:
        'Irregular stems to know: *être* ser-, *avoir* aur-, *aller* ir-, *faire* fer-. All end in r, and the endings never change.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Write each verb in the conditional. Begin with the pronoun given.',
      parts: [
        part({
          prompt: '*je* (vouloir)',
          answer: exactly(
            ['je voudrais'],
            ['je voudrai', 'je voulais', 'je voudrait', 'je veux', 'je voulrais', 'je voudras'],
          ),
          model: 'je voudrais',
          points: [point('*je voudrais*', { reject: ['*je voudrai*, which is future'] })],
        }),
        part({
          prompt: '*on* (pouvoir)',
          answer: exactly(
            ['on pourrait'],
            ['on pourra', 'on pourait', 'on pouvait', 'on pourrais', 'on peut', 'on pouvrait', 'on pourrai'],
          ),
          model: 'on pourrait',
          points: [point('*on pourrait*', { reject: ['*on pourait*'] })],
        }),
        part({
          prompt: '*elle* (aimer)',
          answer: exactly(
            ['elle aimerait'],
            ['elle aimera', 'elle aimerais', 'elle aimait', 'elle aimerai', 'elle aimeraient'],
          ),
          model: 'elle aimerait',
          points: [point('*elle aimerait*', { reject: ['*elle aimera*'] })],
        }),
      ],
    }),
    recall({
      seconds: 170,
      lines: 6,
      stem: `Translate into French.

> If it is sunny tomorrow, I will go to the park. If I had more money, I would travel.`,
      points: [
        point('*S’il fait du soleil demain*', { allow: ['*s’il y a du soleil*'], reject: ['future after *si*'] }),
        point('*j’irai au parc*', { allow: ['*je vais aller au parc*'], reject: ['*j’irais*'] }),
        point('*Si j’avais plus d’argent*', { reject: ['*plus de l’argent*', '*si j’aurais*'] }),
        point('*je voyagerais*', { reject: ['*je voyagerai*'] }),
      ],
      model: 'S’il fait du soleil demain, j’irai au parc. Si j’avais plus d’argent, je voyagerais.',
      tier: 'higher',
      guidance:
        'Present with *si*, then future; imperfect with *si*, then conditional. *Si* is never followed directly by the future or conditional here.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Explain how to form the simple future of a regular verb in French. Give the six endings and one irregular stem.',
      points: [
        point('Use the infinitive as the stem, without the final e of *-re* verbs', { allow: ['*finir-*, *vendr-*'] }),
        point('Add *-ai, -as, -a, -ons, -ez, -ont*', { reject: ['*-ais, -ait* (conditional)'] }),
        point('One irregular stem, such as *ser-* (être), *aur-* (avoir), *ir-* (aller) or *fer-* (faire)', {
          allow: ['*pourr-, devr-, verr-, viendr-, voudr-*'],
        }),
      ],
      model:
        'Take the infinitive, dropping the final e of -re verbs, and add -ai, -as, -a, -ons, -ez, -ont. Some verbs have an irregular stem, such as ser- for être.',
    }),
  ],
};

const translation: TopicContent = {
  number: '11',
  title: 'Reading passages and translation',
  weights: { 1: 4, 2: 6 },
  questions: [
    shortParts({
      seconds: 170,
      stem: `Read the article. Answer in English.

> *À dix-sept ans, Inès passe ses samedis dans une ferme près de Lyon. « Je me lève à cinq heures, c’est dur, dit-elle, surtout en hiver. Mais les animaux n’attendent pas ! » Elle n’est pas payée, mais elle apprend beaucoup. Selon ses parents, elle devrait être avocate ; elle rêve plutôt d’être vétérinaire.*`,
      parts: [
        part({
          prompt: 'Where does Inès spend her Saturdays?',
          answer: exactly(
            [
              'on a farm',
              'a farm',
              'at a farm',
              'farm',
              'on a farm near Lyon',
              'at a farm near Lyon',
              'in a farm',
              'in a farm near Lyon',
              'a farm near Lyon',
              'on the farm',
              'at the farm',
            ],
            ['closed', 'a factory'],
          ),
          model: 'on a farm',
          points: ['On a farm (near Lyon)'],
        }),
        part({
          prompt: 'At what time does she get up?',
          answer: {
            kind: 'text',
            accept: [
              "five o'clock",
              "5 o'clock",
              '5 am',
              '5am',
              'five',
              '5',
              '5:00',
              '05:00',
              '5.00',
              '5 a.m.',
              'five am',
              'five in the morning',
              '5 in the morning',
              "at five o'clock",
              "at 5 o'clock",
              'at five',
              'five oclock',
              '5 oclock',
              '5:00 am',
              '05:00 am',
              '5.00 am',
              '0500',
              'at 5',
              'at 5 am',
              'at five am',
              'at five in the morning',
              '5h',
              '5h00',
            ],
            reject: ["four o'clock", "six o'clock", '4', '6', '4 am', '6 am', '5 pm', 'five pm', '15', 'fifteen'],
            unlisted: 'selfMark',
          },
          model: "five o'clock",
          points: ['At five o’clock'],
        }),
        part({
          prompt: 'What job do her parents think she should do?',
          answer: {
            kind: 'text',
            accept: [
              'lawyer',
              'a lawyer',
              'solicitor',
              'a solicitor',
              'barrister',
              'a barrister',
              'to be a lawyer',
              'be a lawyer',
              'become a lawyer',
              'to become a lawyer',
              'attorney',
              'an attorney',
            ],
            reject: ['vet', 'a vet', 'avocado', 'an avocado', 'nurse', 'farmer', 'doctor'],
            unlisted: 'selfMark',
          },
          model: 'lawyer',
          points: [point('Lawyer', { allow: ['solicitor', 'barrister'], reject: ['vet'] })],
        }),
        part({
          prompt: 'What job does she dream of doing?',
          answer: {
            kind: 'text',
            accept: [
              'vet',
              'a vet',
              'veterinarian',
              'veterinary surgeon',
              'a veterinary surgeon',
              'to be a vet',
              'being a vet',
              'a veterinarian',
              'becoming a vet',
              'be a vet',
              'animal doctor',
            ],
            reject: ['lawyer', 'a lawyer', 'solicitor', 'barrister', 'farmer', 'a farmer', 'doctor', 'nurse'],
            unlisted: 'selfMark',
          },
          model: 'vet',
          points: ['Vet'],
        }),
      ],
      guidance:
        '*Selon ses parents* is *according to her parents*, and *devrait* is *should*. *Elle rêve plutôt de* gives her own wish.',
    }),
    shortParts({
      seconds: 90,
      stem: 'Each French word looks like an English word but means something else. Translate it into English.',
      parts: [
        part({
          prompt: '*une librairie*',
          answer: {
            kind: 'text',
            accept: [
              'bookshop',
              'a bookshop',
              'book shop',
              'a book shop',
              'bookstore',
              'a bookstore',
              'book store',
              "bookseller's",
              'a shop that sells books',
            ],
            reject: ['library', 'a library', 'librarian', 'bookcase'],
            unlisted: 'selfMark',
          },
          model: 'a bookshop',
          points: [point('a bookshop', { reject: ['a library'] })],
        }),
        part({
          prompt: '*assister à*',
          answer: {
            kind: 'text',
            accept: [
              'to attend',
              'attend',
              'attending',
              'to be present at',
              'to be present',
              'to be at',
              'to go to',
              'to witness',
            ],
            reject: ['to assist', 'assist', 'assist at', 'assist with', 'to help', 'help', 'to wait'],
            unlisted: 'selfMark',
          },
          model: 'to attend',
          points: [point('to attend', { reject: ['to assist'] })],
        }),
        part({
          prompt: '*actuellement*',
          answer: {
            kind: 'text',
            accept: [
              'currently',
              'at the moment',
              'at this moment',
              'at the present time',
              'at present',
              'now',
              'presently',
              'nowadays',
              'right now',
            ],
            reject: ['actually', 'in fact', 'really'],
            unlisted: 'selfMark',
          },
          model: 'currently',
          points: [point('currently', { allow: ['at the moment'], reject: ['actually'] })],
        }),
        part({
          prompt: '*la journée*',
          answer: {
            kind: 'text',
            accept: ['the day', 'day', 'daytime', 'the daytime', 'day time', 'the whole day', 'all day'],
            reject: ['journey', 'the journey', 'trip', 'the trip', 'today'],
            unlisted: 'selfMark',
          },
          model: 'the day',
          points: [point('the day', { reject: ['the journey'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 130,
      stem: `Read three people’s opinions of their town’s new cinema. For each one write *positive*, *negative* or *both*.

- **Noé** *Les sièges sont confortables, mais les billets sont beaucoup trop chers.*
- **Jade** *Il n’y a que de vieux films. Je n’y retournerai plus !*
- **Sami** *Je ne connais rien de plus agréable quand il pleut !*`,
      parts: [
        part({
          prompt: 'Noé',
          answer: words(
            'both',
            'positive and negative',
            'negative and positive',
            'p+n',
            'p/n',
            'positive + negative',
            'positive/negative',
          ),
          model: 'both',
          points: [point('Both', { reject: ['positive only'] })],
        }),
        part({
          prompt: 'Jade',
          answer: words('negative', 'negatif', 'n'),
          model: 'negative',
          points: ['Negative'],
        }),
        part({
          prompt: 'Sami',
          answer: words('positive', 'positif', 'p'),
          model: 'positive',
          points: [point('Positive', { reject: ['negative, from *ne … rien* alone'] })],
        }),
      ],
      guidance:
        'A negative verb need not be a negative opinion: *Je ne connais rien de plus agréable* is *I know nothing more pleasant*.',
    }),
    recall({
      seconds: 200,
      lines: 8,
      stem: `Translate into English.

> *J’habite ici depuis cinq ans. Avant, il y avait une usine près de chez moi, mais on l’a remplacée par un parc. Les voisins sont contents, car l’air est plus propre. J’espère que le maire va planter encore plus d’arbres.*`,
      points: [
        point('I have lived here for five years.', {
          allow: ['I have been living here'],
          reject: ['I lived here', 'I live here since'],
        }),
        point('Before, there used to be a factory near my house,', { allow: ['there was', 'near where I live'] }),
        point('but they replaced it with a park.', { allow: ['it has been replaced by', 'we, someone'] }),
        point('The neighbours are pleased, because the air is cleaner.', {
          allow: ['happy'],
          reject: ['the air is clean'],
        }),
        point('I hope the mayor is going to plant even more trees.', {
          allow: ['will plant'],
          reject: ['more trees, without *even* or *still*'],
        }),
      ],
      model:
        'I have lived here for five years. Before, there used to be a factory near my house, but they replaced it with a park. The neighbours are pleased because the air is cleaner. I hope the mayor is going to plant even more trees.',
      guidance:
        '*Habite … depuis* is present in French but *have lived … for* in English. Watch the small words: *plus propre* is *cleaner*.',
    }),
    recall({
      seconds: 200,
      lines: 8,
      stem: `Translate into French.

> I usually play tennis at the weekend, but last Saturday I stayed at home because it was raining. Tomorrow I am going to visit my grandmother.`,
      points: [
        point('*D’habitude, je joue au tennis le week-end,*', { allow: ['*normalement*'], reject: ['*du tennis*'] }),
        point('*mais samedi dernier je suis resté(e) à la maison*', {
          allow: ['*chez moi*'],
          reject: ['*j’ai resté*'],
        }),
        point('*parce qu’il pleuvait.*', { allow: ['*car*'], reject: ['*il pleut*', '*parce que il*'] }),
        point('*Demain, je vais*', { allow: ['*j’irai voir*'], reject: ['*je suis allant*'] }),
        point('*rendre visite à ma grand-mère.*', {
          allow: ['*voir ma grand-mère*', '*visiter ma grand-mère*'],
          reject: ['*mon grand-mère*'],
        }),
      ],
      model:
        'D’habitude, je joue au tennis le week-end, mais samedi dernier je suis resté à la maison parce qu’il pleuvait. Demain, je vais rendre visite à ma grand-mère.',
      guidance:
        'Three time frames: present for the habit, perfect and imperfect for last Saturday, near future for tomorrow.',
    }),
  ],
};

export const tenseTopics: TopicContent[] = [past, future, translation];
