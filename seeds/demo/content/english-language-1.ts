import { part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const retrieval: TopicContent = {
  number: '1',
  title: 'Retrieval and inference',
  weights: { 1: 8, 2: 8 },
  questions: [
    shortParts({
      seconds: 110,
      stem: `Read the extract.

> The ferry was late again. Marta stood at the end of the jetty with her coat buttoned to the chin, and for the fourth time in ten minutes she took the letter from her pocket, looked at the envelope and put it back. Behind her the café owner was stacking chairs. He had already turned the sign on the door.`,
      parts: [
        part({
          prompt: 'Where is Marta standing?',
          answer: wording(
            'at the end of the jetty',
            'the end of the jetty',
            'on the end of the jetty',
            'on the jetty',
            'on a jetty',
            'the jetty',
          ),
          model: 'at the end of the jetty',
          points: [point('At the end of the jetty', { allow: ['on the jetty'], reject: ['on the ferry'] })],
        }),
        part({
          prompt: 'What is Marta waiting for?',
          answer: wording(
            'the ferry',
            'a ferry',
            'ferry',
            'the late ferry',
            'the ferry to arrive',
            'for the ferry',
            'the boat',
            'a boat',
            'boat',
          ),
          model: 'the ferry',
          points: [point('The ferry', { allow: ['the boat'] })],
        }),
        part({
          prompt: 'Give one sign that the café is about to close.',
          lines: 2,
          answer: wording(
            'the owner is stacking chairs',
            'the café owner was stacking chairs',
            'the cafe owner was stacking chairs',
            'the owner was stacking chairs',
            'he is stacking chairs',
            'he was stacking chairs',
            'stacking chairs',
            'the chairs are being stacked',
            'he had already turned the sign on the door',
            'the sign on the door has been turned',
            'he has turned the sign',
          ),
          model: 'the owner is stacking chairs',
          points: [
            point('The owner is stacking chairs, or has turned the sign on the door', {
              ignore: ['it is late', 'it is dark'],
            }),
          ],
        }),
      ],
      guidance:
        'Retrieval marks want a detail from the extract. Nothing has to be explained, so keep each answer to a phrase.',
    }),
    short({
      seconds: 50,
      stem: `Read the sentence.

> For the fourth time in ten minutes she took the letter from her pocket, looked at the envelope and put it back unopened.

What does this suggest about how the woman feels? Answer in a word or a short phrase.`,
      answer: wording(
        'nervous',
        'anxious',
        'afraid',
        'worried',
        'she is nervous',
        'she is anxious',
        'she is afraid',
        'she is worried',
        'apprehensive',
        'uneasy',
        'fearful',
        'scared',
        'reluctant',
        'hesitant',
        'undecided',
        'afraid of what it says',
        'she is afraid of what the letter says',
      ),
      model: 'she is afraid of what the letter says',
      points: [
        point('She is anxious about, or afraid of, what the letter may say', {
          allow: ['nervous', 'hesitant', 'torn between wanting to know and not wanting to'],
          reject: ['calm', 'bored'],
        }),
      ],
      guidance:
        'An inference names something the writer does not say. Test it against the detail: an unopened letter taken out four times fits fear better than impatience.',
    }),
    short({
      seconds: 40,
      stem: `Read the sentence.

> Joss was reluctant to hand over the key.

Which one of these words is closest in meaning to *reluctant*: *eager*, *unwilling*, *unable*, *careless*?`,
      answer: words('unwilling'),
      model: 'unwilling',
      points: ['Unwilling'],
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: `Read the extract.

> The café owner had turned the sign to Closed, but he left the lamp over the door burning and did not ask the girl to go. He wiped tables that were already clean. When the ferry’s horn sounded at last, he came out with a paper bag, put it beside her, said it would only go stale, and went back in before she could find her purse.

What impressions do you get of the café owner? Support your answer with references to the extract.`,
      points: [
        point('Infers that he is kind or considerate', { allow: ['caring', 'thoughtful', 'generous'] }),
        point('Supports this, for example “left the lamp over the door burning” or gives her the paper bag', {
          reject: ['a reference with no link to the inference'],
        }),
        point('Makes a second, different inference: he is tactful, modest or does not want thanks', {
          allow: ['he is patient', 'he wants to keep her company without intruding'],
        }),
        point(
          'Supports this, for example “said it would only go stale”, he goes in “before she could find her purse”, or he wipes clean tables',
        ),
      ],
      model:
        'He seems kind, because he “left the lamp over the door burning” for the girl although the café was closed. He also seems tactful and does not want to be thanked: he says the food “would only go stale”, so that she can take it without feeling in debt, and goes in “before she could find her purse”.',
      guidance:
        'Two inferences with a quotation each earn more than one inference explained twice. Keep quotations to a few words.',
    }),
    recall({
      seconds: 90,
      lines: 5,
      stem: 'Explain the difference between retrieving information from a text and making an inference from it.',
      points: [
        'Retrieval finds something the text states directly',
        point('Inference works out something the text only suggests', {
          allow: ['reading between the lines'],
        }),
        point('An inference must be supported by evidence from the text', { ignore: ['a definition of evidence'] }),
      ],
      model:
        'Retrieving means finding information that the text states directly. Inferring means working out something the text suggests but does not say, and an inference has to be supported by evidence such as a quotation.',
    }),
  ],
};

const wordChoice: TopicContent = {
  number: '2',
  title: 'Word classes and word choice',
  weights: { 1: 10 },
  questions: [
    shortParts({
      seconds: 90,
      stem: `Read the sentence.

> The old dog limped slowly towards the gate.

Write down one word from the sentence for each part.`,
      parts: [
        part({
          prompt: 'The verb',
          answer: words('limped'),
          model: 'limped',
          points: ['limped'],
        }),
        part({
          prompt: 'The adverb',
          answer: words('slowly'),
          model: 'slowly',
          points: ['slowly'],
        }),
        part({
          prompt: 'The preposition',
          answer: words('towards'),
          model: 'towards',
          points: ['towards'],
        }),
      ],
      guidance:
        'Ask what the word does in this sentence. *Slowly* tells you how the dog limped; *towards* joins the movement to the gate.',
    }),
    short({
      seconds: 35,
      stem: 'State the term for the ideas and feelings that a word suggests beyond its dictionary meaning.',
      answer: exactly(
        [
          'connotation',
          'connotations',
          'the connotations of the word',
          'its connotations',
          'connotative meaning',
          'connotative meanings',
        ],
        ['denotation', 'denotations'],
      ),
      model: 'connotations',
      points: [point('Connotation(s)', { reject: ['denotation'] })],
      guidance: '*Denotation* is the dictionary meaning. *Connotation* is what comes with it.',
    }),
    short({
      seconds: 40,
      stem: 'The nouns *courage*, *silence* and *regret* name ideas or states that cannot be touched. State the term for this kind of noun.',
      answer: exactly(['abstract', 'abstract noun', 'abstract nouns'], ['concrete', 'concrete noun', 'concrete nouns']),
      model: 'abstract noun',
      points: [point('Abstract (noun)', { reject: ['concrete', 'proper'] })],
    }),
    short({
      seconds: 55,
      stem: `Read the sentence.

> Exhausted, the climbers stumbled into the hut and collapsed beside the cold stove.

Write down the two verbs that show how tired the climbers are.`,
      answer: wording(
        'stumbled and collapsed',
        'stumbled, collapsed',
        'stumbled collapsed',
        'collapsed and stumbled',
        'collapsed, stumbled',
        'stumbled into the hut and collapsed',
      ),
      model: 'stumbled and collapsed',
      points: ['stumbled', 'collapsed'],
      guidance: '*Exhausted* also shows tiredness, but here it describes the climbers, as an adjective would.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: `Read the sentence.

> All night the wind clawed at the tents.

Explain the effect of the verb *clawed*.`,
      points: [
        point('*Clawed* has connotations of a wild animal or of an attack', { allow: ['predator', 'beast', 'talons'] }),
        point('It makes the wind seem alive, violent or deliberate', { allow: ['personification', 'zoomorphism'] }),
        point('The reader senses danger, or how fragile the tents and the people in them are', {
          ignore: ['“it makes the reader want to read on”'],
        }),
      ],
      model:
        'The verb “clawed” has connotations of a wild animal attacking its prey, so the wind seems alive and determined to get in. The reader feels how thin the tents are and that the people inside are in danger.',
      guidance:
        'Start with what the word makes you picture, then say what that does to the scene. A general remark about the reader earns nothing.',
    }),
    recall({
      seconds: 110,
      lines: 6,
      stem: `Read the two sentences.

- The crowd moved into the square.
- The crowd surged into the square.

Explain how the writer’s choice of *surged* changes the meaning of the second sentence.`,
      points: [
        point('*Moved* is neutral, or tells us nothing about the manner', { allow: ['plain', 'vague'] }),
        '*Surged* suggests sudden force, speed or energy',
        point('It suggests a wave or the sea, so the crowd acts as one mass', {
          allow: ['the crowd cannot be stopped or controlled'],
        }),
      ],
      model:
        '“Moved” is neutral and gives no idea of how the people went. “Surged” suggests sudden power and speed. It is a word often used of waves, so the crowd becomes a single mass that could not be held back.',
    }),
  ],
};

const techniques: TopicContent = {
  number: '3',
  title: 'Imagery and language techniques',
  weights: { 1: 12, 2: 8 },
  questions: [
    short({
      seconds: 40,
      stem: `Name the technique in this sentence.

> The moon was a coin dropped in a well.`,
      answer: exactly(
        ['metaphor', 'a metaphor', 'metaphors', 'metaphorical', 'metaphorical language'],
        ['simile', 'personification'],
      ),
      model: 'metaphor',
      points: [point('Metaphor', { reject: ['simile', 'personification'] })],
      guidance: 'There is no *like* or *as*: the moon *was* a coin. That makes it a metaphor.',
    }),
    shortParts({
      seconds: 100,
      stem: 'Name the technique used in each sentence.',
      parts: [
        part({
          prompt: 'The bacon hissed and popped in the pan.',
          answer: words('onomatopoeia', 'onomatopoeic', 'onomatopoeic verbs', 'onomatopoeic words', 'onomatopoeically'),
          model: 'onomatopoeia',
          points: ['Onomatopoeia'],
        }),
        part({
          prompt: 'Her bag weighed more than a planet.',
          answer: words(
            'hyperbole',
            'exaggeration',
            'hyperbolic language',
            'hyperbolic',
            'overstatement',
            'exaggerated',
            'exaggerating',
            'over-exaggeration',
            'exaggerated language',
          ),
          model: 'hyperbole',
          points: [point('Hyperbole', { allow: ['exaggeration'] })],
        }),
        part({
          prompt: 'Bright banners billowed by the bridge.',
          answer: words(
            'alliteration',
            'plosive alliteration',
            'plosives',
            'plosive sounds',
            'plosive',
            'alliterative',
            'alliterating',
            'alliterates',
          ),
          model: 'alliteration',
          points: [point('Alliteration', { allow: ['plosive sounds'], reject: ['sibilance', 'rhyme'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: `Name the technique that gives the fog human actions in this sentence.

> The fog crept up the stairs and listened at every door.`,
      answer: exactly(
        [
          'personification',
          'personifying',
          'personified',
          'the fog is personified',
          'personify',
          'personifies',
          'personifying the fog',
          'anthropomorphism',
        ],
        ['pathetic fallacy', 'simile'],
      ),
      model: 'personification',
      points: [
        point('Personification', { allow: ['anthropomorphism'], reject: ['pathetic fallacy', 'simile', 'metaphor'] }),
      ],
      guidance:
        'Pathetic fallacy is weather or nature reflecting a mood. Here the fog is made to act as a person would, which is personification.',
    }),
    short({
      seconds: 40,
      stem: 'State the term for two words of opposite meaning placed next to each other, as in *a deafening silence*.',
      answer: exactly(
        ['oxymoron', 'an oxymoron', 'oxymorons', 'oxymoronic', 'contradiction in terms'],
        ['antithesis', 'paradox'],
      ),
      model: 'oxymoron',
      points: [
        point('Oxymoron', { allow: ['contradiction in terms'], reject: ['antithesis', 'paradox', 'juxtaposition'] }),
      ],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: `Read the sentence.

> The cinema had gone from the middle of the terrace like a pulled tooth.

How does the writer use language here to describe the change to the street?`,
      points: [
        point('Identifies the simile “like a pulled tooth”', { reject: ['metaphor'] }),
        'Explains that the street is compared with a mouth, or the empty space with a gap between teeth',
        point('Explains what this suggests: pain, violence, damage or loss', { allow: ['decay'] }),
        point('Explains the effect: the gap spoils the whole street and cannot be ignored', {
          allow: ['the cinema is missed', 'the street now looks ugly or incomplete'],
        }),
      ],
      model:
        'The simile “like a pulled tooth” compares the terrace with a mouth and the place where the cinema stood with a gap between teeth. A tooth that has been pulled suggests pain and force, so the loss of the cinema seems violent. The reader pictures a row that was once complete and is now spoiled by a gap nobody can help noticing.',
      guidance:
        'Naming the simile is the first mark only. The rest are for what a pulled tooth makes you feel and how that fits a street.',
    }),
    recall({
      seconds: 90,
      lines: 5,
      stem: 'A student writes: “The writer uses a metaphor. This makes the reader want to read on.” State three things the student should do to turn this into a good analysis.',
      points: [
        point('Quote the metaphor, briefly', { allow: ['give evidence', 'refer to the exact words'] }),
        point('Explain what the words suggest or their connotations', { allow: ['zoom in on a word'] }),
        point('Explain a specific effect, or link it to the writer’s purpose', {
          reject: ['say that it makes the reader want to read on'],
        }),
      ],
      model:
        'The student should quote the metaphor, explain what the words in it suggest, and describe a specific effect that fits the writer’s purpose at that point in the text.',
    }),
  ],
};

export const wordTopics: TopicContent[] = [retrieval, wordChoice, techniques];
