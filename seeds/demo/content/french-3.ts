import { part, point, recall, short, shortParts, type TopicContent, wording } from './build.ts';
import { exactly } from './exact-words.ts';

const adjectives: TopicContent = {
  number: '7',
  title: 'Articles, nouns and agreement',
  weights: { 1: 2, 2: 6 },
  questions: [
    shortParts({
      seconds: 100,
      stem: 'Write the adjective in brackets in its correct form.',
      parts: [
        part({
          prompt: '*une voiture* (blanc)',
          answer: exactly(['blanche', 'une voiture blanche'], ['blanc', 'blance', 'blanches', 'blancs', 'blanque']),
          model: 'blanche',
          points: ['*blanche*'],
        }),
        part({
          prompt: '*une* (vieux) *maison*',
          answer: exactly(['vieille', 'une vieille maison'], ['vieux', 'vieil', 'vieilles', 'vieuse', 'viel']),
          model: 'vieille',
          points: ['*vieille*'],
        }),
        part({
          prompt: '*un* (beau) *hôtel*',
          answer: exactly(['bel', 'un bel hôtel'], ['beau', 'belle', 'beaux', 'belles']),
          model: 'bel',
          points: [point('*bel*', { reject: ['*beau*', '*belle*'] })],
        }),
        part({
          prompt: '*des films* (intéressant)',
          answer: exactly(
            ['intéressants', 'des films intéressants'],
            ['intéressant', 'intéressante', 'intéressantes', 'interresants', 'intéressents'],
          ),
          model: 'intéressants',
          points: [point('*intéressants*', { reject: ['*intéressantes*'] })],
        }),
      ],
      guidance:
        'Before a masculine noun that begins with a vowel or silent h, *beau, nouveau* and *vieux* become *bel, nouvel* and *vieil*.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Translate into French. Use the correct possessive adjective.',
      parts: [
        part({
          prompt: 'my school (*école*, feminine)',
          answer: exactly(['mon école'], ['ma école', 'mes école', "m'école", 'mon écoles', 'mes écoles']),
          model: 'mon école',
          points: [point('*mon école*', { reject: ['*ma école*'] })],
        }),
        part({
          prompt: 'her brother (*frère*)',
          answer: exactly(
            ['son frère'],
            ['sa frère', 'ses frère', 'leur frère', 'mon frère', 'ton frère', 'ses frères'],
          ),
          model: 'son frère',
          points: [point('*son frère*', { reject: ['*sa frère*'] })],
        }),
        part({
          prompt: 'our friends (*amis*)',
          answer: exactly(['nos amis'], ['notre amis', 'notres amis', 'nous amis', 'vos amis', 'nos ami', 'mes amis']),
          model: 'nos amis',
          points: [point('*nos amis*', { reject: ['*notre amis*'] })],
        }),
      ],
      guidance: 'The possessive agrees with the thing owned, not the owner. Before a vowel, *ma* becomes *mon*.',
    }),
    shortParts({
      seconds: 75,
      stem: 'Write the plural of each noun. Give the noun only.',
      parts: [
        part({
          prompt: '*un cheval*',
          answer: exactly(
            ['chevaux', 'des chevaux', 'les chevaux'],
            ['chevals', 'cheveux', 'chevales', 'chevauxs', 'des chevals', 'des cheveux'],
          ),
          model: 'chevaux',
          points: [point('*chevaux*', { reject: ['*chevals*', '*cheveux* (hair)'] })],
        }),
        part({
          prompt: '*un gâteau*',
          answer: exactly(['gâteaux', 'des gâteaux', 'les gâteaux'], ['gâteaus', 'gateaus', 'gâteau', 'des gâteaus']),
          model: 'gâteaux',
          points: [point('*gâteaux*', { reject: ['*gâteaus*'] })],
        }),
        part({
          prompt: '*un œil*',
          answer: exactly(['yeux', 'des yeux', 'les yeux'], ['œils', 'oeils', 'œil', 'jeux', 'eux', 'yeuxs', 'yeus']),
          model: 'yeux',
          points: ['*yeux*'],
        }),
      ],
    }),
    short({
      seconds: 60,
      stem: `Translate into French.

> My sister is taller than me.`,
      answer: wording('Ma sœur est plus grande que moi.', 'Ma soeur est plus grande que moi.'),
      model: 'Ma sœur est plus grande que moi.',
      points: [
        point('*Ma sœur est plus grande*', { reject: ['*plus grand*', '*mon sœur*', '*et* for *est*'] }),
        point('*que moi*', { reject: ['*que je*', '*que me*'] }),
      ],
      guidance: 'Comparatives are *plus … que*. The adjective still agrees, and after *que* the pronoun is *moi*.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Explain when to use each French word for *this* or *these*: *ce*, *cet*, *cette* and *ces*.',
      points: [
        point('*ce*: before a masculine singular noun that begins with a consonant', { allow: ['*ce livre*'] }),
        point('*cet*: before a masculine singular noun that begins with a vowel or silent h', {
          allow: ['*cet hôtel*'],
        }),
        point('*cette*: before a feminine singular noun', { allow: ['*cette maison*'] }),
        point('*ces*: before any plural noun', { allow: ['*ces enfants*'], reject: ['*ses*, which means his or her'] }),
      ],
      model:
        'Ce is used before a masculine singular noun beginning with a consonant (ce livre), cet before a masculine singular noun beginning with a vowel or silent h (cet hôtel), cette before any feminine singular noun (cette maison), and ces before any plural noun (ces enfants).',
    }),
    recall({
      seconds: 110,
      lines: 6,
      stem: 'Explain where adjectives go in a French sentence. Give one example of an adjective in each position.',
      points: [
        point('Most adjectives follow the noun', { reject: ['all adjectives follow the noun'] }),
        point('An example, such as *un pull rouge*', {
          allow: ['any adjective of colour or nationality after a noun'],
        }),
        point('Some short, common adjectives come before the noun', { allow: ['beauty, age, goodness and size'] }),
        point('An example, such as *un petit chien*', {
          allow: ['*grand, beau, vieux, nouveau, jeune, bon, mauvais, joli*'],
        }),
      ],
      model:
        'Most adjectives come after the noun, as in un pull rouge. A few short, common ones, such as petit, grand, beau and vieux, come before it, as in un petit chien.',
    }),
  ],
};

const present: TopicContent = {
  number: '8',
  title: 'Present tense, questions and negatives',
  weights: { 1: 3, 2: 8 },
  questions: [
    shortParts({
      seconds: 100,
      stem: 'Write the verb in brackets in the present tense. Give the verb only.',
      parts: [
        part({
          prompt: '*Nous* ______ *à trois heures.* (finir)',
          answer: exactly(
            ['finissons', 'nous finissons'],
            ['finons', 'finisons', 'finissent', 'finissez', 'finirons', 'finissions'],
          ),
          model: 'finissons',
          points: ['*finissons*'],
        }),
        part({
          prompt: '*Ils* ______ *un chien.* (avoir)',
          answer: exactly(['ont', 'ils ont'], ['on', 'sont', 'avont', 'a', 'vont', 'ils sont', 'ils avont', 'font']),
          model: 'ont',
          points: [point('*ont*', { reject: ['*sont*'] })],
        }),
        part({
          prompt: '*Vous* ______ *du sport ?* (faire)',
          answer: exactly(
            ['faites', 'vous faites'],
            ['faisez', 'faitez', 'faits', 'fait', 'faire', 'fêtes', 'vous faisez'],
          ),
          model: 'faites',
          points: [point('*faites*', { reject: ['*faisez*'] })],
        }),
        part({
          prompt: '*Je* ______ *au marché.* (aller)',
          answer: exactly(['vais', 'je vais'], ['vas', 'va', 'alle', 'allais', 'aller', 'je vas', 'vai', 'fais']),
          model: 'vais',
          points: [point('*vais*', { reject: ['*va*', '*vas*'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 70,
      stem: 'Write the reflexive verb in the present tense. Begin with the pronoun given.',
      parts: [
        part({
          prompt: '*je* (se coucher)',
          answer: exactly(
            ['je me couche', 'me couche'],
            ['je se couche', 'je me couches', 'je couche', 'je me coucher', 'je mes couche'],
          ),
          model: 'je me couche',
          points: [point('*je me couche*', { reject: ['*je se couche*'] })],
        }),
        part({
          prompt: '*elle* (s’habiller)',
          answer: exactly(
            ["elle s'habille", "s'habille"],
            ["elle s'habilles", "elle s'habiller", "elle m'habille", "elle t'habille"],
          ),
          model: "elle s'habille",
          points: [point('*elle s’habille*', { reject: ['*elle se habille*', '*elle habille*'] })],
        }),
        part({
          prompt: '*nous* (se laver)',
          answer: exactly(
            ['nous nous lavons'],
            ['nous se lavons', 'nous nous lavent', 'nous nous lavez', 'nous nous laverons', 'nous nous lavions'],
          ),
          model: 'nous nous lavons',
          points: [point('*nous nous lavons*', { reject: ['*nous lavons*', '*nous se lavons*'] })],
        }),
      ],
      guidance: 'Change *se* to match the subject: *je me, tu te, il se, nous nous, vous vous, ils se*.',
    }),
    shortParts({
      seconds: 90,
      stem: 'Give the English meaning of each negative.',
      parts: [
        part({
          prompt: '*ne … jamais*',
          answer: exactly(
            ['never', 'not ever', 'not ... ever'],
            ['no longer', 'not yet', 'always', 'nothing', 'nobody'],
          ),
          model: 'never',
          points: [point('never', { reject: ['ever'] })],
        }),
        part({
          prompt: '*ne … plus*',
          answer: exactly(
            [
              'no longer',
              'not any more',
              'not ... any more',
              'no more',
              'not any longer',
              'not ... any longer',
              'not anymore',
              'any more',
            ],
            ['most', 'never', 'nothing'],
          ),
          model: 'no longer',
          points: [point('no longer', { allow: ['no more', 'not any more'], reject: ['more'] })],
        }),
        part({
          prompt: '*ne … que*',
          answer: {
            kind: 'text',
            accept: ['only', 'nothing but', 'just', 'nothing except', 'not ... except', 'except', 'merely'],
            reject: ['that', 'what', 'not that', 'nothing', 'never', 'no longer', 'nobody'],
            unlisted: 'selfMark',
          },
          model: 'only',
          points: [point('only', { allow: ['nothing but'] })],
        }),
        part({
          prompt: '*ne … personne*',
          answer: exactly(
            ['nobody', 'no one', 'no-one', 'not anyone', 'not anybody', 'noone', 'not ... anyone', 'not ... anybody'],
            ['person', 'nothing', 'somebody', 'someone'],
          ),
          model: 'nobody',
          points: [point('nobody', { allow: ['no one'], reject: ['person'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 90,
      stem: 'Rewrite each French sentence so that it has the meaning given in English.',
      parts: [
        part({
          prompt: '*Je mange de la viande.* (I never eat meat.)',
          answer: exactly(
            ['Je ne mange jamais de viande.', 'Jamais je ne mange de viande.'],
            [
              'Je ne mange jamais de la viande.',
              'Je mange jamais de viande.',
              'Je ne jamais mange de viande.',
              'Je ne mange pas de viande.',
              'Je ne mange jamais la viande.',
              'Je ne mange jamais des viande.',
            ],
          ),
          model: 'Je ne mange jamais de viande.',
          points: [point('*Je ne mange jamais de viande*', { reject: ['*jamais de la viande*'] })],
        }),
        part({
          prompt: '*Je comprends tout.* (I understand nothing.)',
          answer: exactly(
            ['Je ne comprends rien.', 'Je ne comprends rien du tout.', "Je n'y comprends rien."],
            [
              'Je comprends rien.',
              'Je ne rien comprends.',
              'Je ne comprends pas rien.',
              'Je ne comprend rien.',
              'Je ne comprends pas.',
              'Je ne comprends bien.',
            ],
          ),
          model: 'Je ne comprends rien.',
          points: [point('*Je ne comprends rien*', { reject: ['*pas rien*'] })],
        }),
      ],
      guidance: 'The two halves of the negative go round the verb, and *de la* becomes *de*.',
    }),
    recall({
      seconds: 100,
      lines: 5,
      stem: 'Describe three ways of turning *Tu aimes le sport* into a question in French. Give the question each time.',
      points: [
        point('Keep the order and raise the voice: *Tu aimes le sport ?*', { allow: ['add a question mark'] }),
        point('Put *est-ce que* first: *Est-ce que tu aimes le sport ?*', {
          reject: ['*est-ce que* followed by inversion'],
        }),
        point('Invert verb and pronoun: *Aimes-tu le sport ?*', { reject: ['the hyphen left out'] }),
      ],
      model:
        'You can keep the word order and raise your voice (Tu aimes le sport ?), put est-ce que at the beginning (Est-ce que tu aimes le sport ?), or invert the verb and pronoun with a hyphen (Aimes-tu le sport ?).',
    }),
    recall({
      seconds: 110,
      lines: 5,
      stem: 'Explain how to form the present tense of a regular *-er* verb such as *regarder*. Give all six endings.',
      points: [
        'Take *-er* off the infinitive to find the stem (*regard-*)',
        point('Singular endings: *-e, -es, -e*', { reject: ['*-s* for *je*'] }),
        point('Plural endings: *-ons, -ez, -ent*', { reject: ['*-ont* for *ils* and *elles*'] }),
      ],
      model:
        'Take -er off the infinitive to leave the stem regard-. Add -e for je, -es for tu, -e for il, elle and on, -ons for nous, -ez for vous and -ent for ils and elles.',
    }),
  ],
};

export const presentTopics: TopicContent[] = [adjectives, present];
