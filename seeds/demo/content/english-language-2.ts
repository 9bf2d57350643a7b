import { part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const structure: TopicContent = {
  number: '4',
  title: 'Narrative structure and voice',
  weights: { 1: 14 },
  questions: [
    short({
      seconds: 35,
      stem: 'State the term for a part of a narrative that goes back to events before the present moment of the story.',
      answer: exactly(
        ['flashback', 'flashbacks', 'flash back', 'a flashback', 'analepsis', 'analeptic', 'retrospection'],
        ['flashforward', 'flash-forward', 'foreshadowing'],
      ),
      model: 'flashback',
      points: [point('Flashback', { allow: ['analepsis'], reject: ['foreshadowing'] })],
    }),
    short({
      seconds: 45,
      stem: 'A short story opens with a child shutting a red gate and ends, years later, with the same person opening it. State the term for a structure in which the ending returns to the opening.',
      answer: {
        kind: 'text',
        accept: [
          'cyclical',
          'cyclical structure',
          'cyclic',
          'cyclic structure',
          'circular',
          'circular structure',
          'circular narrative',
          'cyclical narrative',
          'ring composition',
          'ring structure',
          'bookending',
          'bookends',
          'full circle',
        ],
        reject: [
          'linear',
          'linear structure',
          'chronological',
          'chronological structure',
          'flashback',
          'foreshadowing',
        ],
        unlisted: 'selfMark',
      },
      model: 'cyclical structure',
      points: [
        point('Cyclical (structure)', { allow: ['circular', 'bookending'], reject: ['linear', 'chronological'] }),
      ],
    }),
    shortParts({
      seconds: 90,
      stem: 'Each sentence comes from a different story.',
      parts: [
        part({
          prompt:
            'State the narrative person used in: “I knew before I reached the landing that somebody had been in my room.”',
          answer: words(
            'first person',
            'first-person',
            '1st person',
            'first',
            '1st',
            'first person narrative',
            'first person narrator',
            '1st person narrator',
            'first person singular',
          ),
          model: 'first person',
          points: [point('First person', { reject: ['third person'] })],
        }),
        part({
          prompt:
            'State the term for the all-knowing narrator of: “Neither of them knew it, but they would not speak again for eleven years, and each would blame the rain.”',
          answer: words(
            'omniscient',
            'omniscient narrator',
            'third person omniscient',
            'third-person omniscient',
            'omniscient third person',
            'third person omniscient narrator',
            'omniscience',
          ),
          model: 'omniscient narrator',
          points: [
            point('Omniscient (narrator)', { allow: ['third person omniscient'], reject: ['unreliable narrator'] }),
          ],
        }),
      ],
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: `This is the opening of a story.

> From the hill, the town was a handful of lights. Nearer, the lights became windows, and the windows became one window, cracked across the corner, with a candle behind it. The candle went out.

How does the writer structure this opening to interest the reader?`,
      points: [
        point('It begins with a distant or wide view of the town', { allow: ['panoramic view', 'establishing shot'] }),
        point('The focus narrows to one window', { allow: ['zooms in'] }),
        point('Explains an effect of this, such as drawing the reader towards one mystery', {
          ignore: ['“it makes the reader want to read on”, unexplained'],
        }),
        'Explains the effect of ending on the candle going out, such as sudden tension or the question of who put it out',
      ],
      model:
        'The writer begins with a wide view of the town from a hill and then narrows the focus, from lights to windows to one cracked window. The reader is led closer as if walking there and begins to wonder why this window matters. The last sentence, in which the candle goes out, makes the scene suddenly tense, because someone must be inside and may have seen us.',
      guidance:
        'Structure answers follow the focus: what you are shown first, where attention moves, and what the last sentence leaves you with.',
    }),
    recall({
      seconds: 90,
      lines: 5,
      stem: 'Explain what foreshadowing is and two effects it can have on the reader.',
      points: [
        point('A hint or clue, given early, of something that happens later', { allow: ['a warning sign'] }),
        'It builds tension or suspense, because the reader expects something to happen',
        point('It makes the later event seem prepared or inevitable', {
          allow: ['it rewards a second reading', 'it makes the reader look for clues'],
        }),
      ],
      model:
        'Foreshadowing is a hint early in a text of something that happens later. It builds tension because the reader senses that something is coming, and it makes the later event seem inevitable when it arrives.',
    }),
  ],
};

const summary: TopicContent = {
  number: '5',
  title: 'Summary and synthesis',
  weights: { 2: 8 },
  questions: [
    short({
      seconds: 40,
      stem: 'State the term for bringing together information from two texts to make a single point.',
      answer: {
        kind: 'text',
        accept: [
          'synthesis',
          'synthesising',
          'synthesise',
          'synthesizing',
          'synthesize',
          'to synthesise',
          'synthesis of information',
        ],
        reject: ['analysis', 'analyse', 'summary', 'comparison', 'inference', 'evaluation'],
        unlisted: 'selfMark',
      },
      model: 'synthesis',
      points: [point('Synthesis', { reject: ['analysis'] })],
    }),
    short({
      seconds: 70,
      lines: 2,
      stem: `Rewrite this sentence in ten words or fewer, keeping its meaning.

> Due to the fact that the weather was extremely bad, a decision was taken that the match would not be able to go ahead.`,
      answer: wording(
        'The match was cancelled because of bad weather.',
        'The match was cancelled due to bad weather.',
        'Bad weather stopped the match.',
        'The match was called off because of bad weather.',
        'The match was called off due to bad weather.',
        'Because of bad weather, the match was cancelled.',
        'Bad weather meant the match was cancelled.',
        'The match was cancelled because the weather was extremely bad.',
        'The match was cancelled because the weather was bad.',
      ),
      model: 'The match was cancelled because of bad weather.',
      points: [
        point('Says in ten words or fewer that the match was called off and that bad weather was the reason', {
          reject: ['an answer of more than ten words', 'an answer that leaves out the reason'],
        }),
      ],
      guidance:
        'Keep the fact and the reason. “Due to the fact that” is *because*; “a decision was taken that” adds nothing.',
    }),
    shortParts({
      seconds: 150,
      stem: `Read the two extracts about markets.

**Source A (today)** The market is over by noon. Most stalls take cards, and half the customers are collecting orders they placed the night before. It is quick, clean and rather quiet.

**Source B (1880s)** From five in the morning until the gas was lit, the market roared. Every price was shouted, argued over and shouted again, and nobody went home without mud to the knee.`,
      parts: [
        part({
          prompt: 'Give one difference between the hours of the two markets.',
          lines: 2,
          answer: wording(
            'A finishes at noon but B lasts until evening',
            'Source A is over by noon but Source B goes on until dark',
            'The modern market ends at noon but the old one lasted until evening',
            'A ends at midday, B goes on until night',
          ),
          model: 'Source A is over by noon but Source B goes on until dark',
          points: [
            point('The modern market ends by noon, while the older one lasts until evening', {
              allow: ['B lasts all day', 'until the gas (lamps) was lit'],
            }),
          ],
        }),
        part({
          prompt: 'Give one difference between the noise of the two markets.',
          lines: 2,
          answer: wording(
            'A is quiet but B is loud',
            'A is quiet but B is noisy',
            'Source A is quiet but Source B is loud',
            'Source A is quiet but Source B is noisy',
            'The modern market is quiet but the old one was loud',
            'The modern market is quiet but the old one was noisy',
          ),
          model: 'Source A is quiet but Source B is noisy',
          points: [
            point('The modern market is quiet, while the older one is loud or “roared”', {
              allow: ['full of shouting'],
            }),
          ],
        }),
        part({
          prompt: 'Give one difference between the conditions underfoot or the cleanliness of the two markets.',
          lines: 2,
          answer: wording(
            'A is clean but B is muddy',
            'A is clean but B is dirty',
            'Source A is clean but Source B is muddy',
            'Source A is clean but Source B is dirty',
            'The modern market is clean but the old one was muddy',
          ),
          model: 'Source A is clean but Source B is muddy',
          points: ['The modern market is clean, while the older one is muddy'],
        }),
      ],
      guidance: 'A difference needs both sides. One source alone is half an answer and earns nothing here.',
    }),
    recall({
      seconds: 170,
      lines: 8,
      stem: `Read the two accounts of a journey to school.

**Source A** The coach has heating, seat belts and a driver who knows us all by name. I read, mostly, or sleep. Twenty minutes later I step off, dry.

**Source B** We walked the three miles in every weather, my brother and I, with a hot potato in each pocket: first to warm our hands and then to eat. No one thought it hard. We arrived wet, and sat wet until dinner.

Use details from both sources to write a summary of the differences between the two journeys.`,
      points: [
        point('Means of travel: the first goes by coach, the second on foot', { allow: ['is driven / walks'] }),
        point('Comfort or protection from the weather: one arrives dry and warm, the other wet', {
          ignore: ['comment on language or techniques'],
        }),
        point(
          'Makes an inference about a difference, such as that the first journey is easy and passive while the second takes effort',
          {
            allow: ['A is looked after by an adult; B relies on his brother and himself'],
          },
        ),
        'Supports at least one difference with a short reference to each source',
      ],
      model:
        'The first writer travels by coach while the second walks three miles. The first is protected from the weather by “heating” and steps off “dry”, but the second walks “in every weather” and sits “wet until dinner”. This suggests that the first journey asks nothing of the child, who can “sleep”, whereas the second takes effort that the children of the time accepted as normal.',
      guidance:
        'Pair the details: travel with travel, weather with weather. A summary has no marks for naming techniques.',
    }),
    recall({
      seconds: 60,
      lines: 3,
      stem: 'A question asks for a summary of the differences between two texts. State two things that should be left out of the answer.',
      points: [
        point('Analysis of language or structure', { allow: ['naming techniques'] }),
        point('Your own opinion, or information that is not in the texts', {
          allow: ['long copied quotations', 'similarities, as they were not asked for'],
        }),
      ],
      model:
        'It should leave out any analysis of the writers’ language, and any opinion or information of your own that is not in the texts.',
    }),
  ],
};

const comparison: TopicContent = {
  number: '6',
  title: 'Comparing viewpoints',
  weights: { 2: 16 },
  questions: [
    shortParts({
      seconds: 60,
      stem: 'A student is comparing two writers’ views.',
      parts: [
        part({
          prompt: 'Give one word or phrase that introduces a difference.',
          answer: wording(
            'whereas',
            'however',
            'in contrast',
            'by contrast',
            'on the other hand',
            'conversely',
            'while',
            'whilst',
            'but',
            'unlike',
            'although',
            'alternatively',
            'contrastingly',
            'on the contrary',
            'in comparison',
          ),
          model: 'whereas',
          points: [
            point('A connective of contrast, such as *whereas* or *however*', { reject: ['similarly', 'also'] }),
          ],
        }),
        part({
          prompt: 'Give one word or phrase that introduces a similarity.',
          answer: wording(
            'similarly',
            'likewise',
            'equally',
            'in the same way',
            'also',
            'both',
            'just as',
            'in a similar way',
            'correspondingly',
            'too',
            'as well',
          ),
          model: 'similarly',
          points: [
            point('A connective of similarity, such as *similarly* or *likewise*', { reject: ['however', 'whereas'] }),
          ],
        }),
      ],
    }),
    short({
      seconds: 50,
      stem: `Read the extract.

> Oh, wonderful. Another morning at the bus stop, another timetable printed purely for decoration.

State the tone of these sentences.`,
      answer: wording(
        'sarcastic',
        'sarcasm',
        'ironic',
        'irony',
        'sardonic',
        'mocking',
        'a sarcastic tone',
        'bitter',
        'scornful',
        'frustrated',
        'annoyed',
      ),
      model: 'sarcastic',
      points: [point('Sarcastic', { allow: ['ironic', 'mocking', 'frustrated'], reject: ['happy', 'enthusiastic'] })],
      guidance:
        '“Wonderful” cannot be meant: the timetable is useless. Saying the opposite of what you mean, in order to mock, is sarcasm.',
    }),
    shortParts({
      seconds: 80,
      stem: `Read the sentence.

> A zoo is a prison with a gift shop.`,
      parts: [
        part({
          prompt: 'State the writer’s attitude to zoos.',
          answer: wording(
            'negative',
            'critical',
            'disapproving',
            'hostile',
            'against them',
            'he is against them',
            'she is against them',
            'the writer is against zoos',
            'the writer disapproves of zoos',
            'disapproves of them',
            'dislikes them',
            'opposed',
          ),
          model: 'critical',
          points: [point('Critical or disapproving', { allow: ['negative'], reject: ['positive', 'neutral'] })],
        }),
        part({
          prompt: 'Name the technique used to express this attitude.',
          answer: exactly(['metaphor', 'a metaphor', 'metaphors', 'metaphorical'], ['simile', 'personification']),
          model: 'metaphor',
          points: [point('Metaphor', { reject: ['simile'] })],
        }),
        part({
          prompt: 'What does the phrase “with a gift shop” suggest about why zoos exist?',
          lines: 2,
          answer: wording(
            'to make money',
            'they exist to make money',
            'for profit',
            'for money',
            'to make a profit',
            'they only care about money',
            'they want to make money from visitors',
            'they are businesses',
          ),
          model: 'they exist to make money',
          points: [
            point('That they exist to make money', {
              allow: ['for profit', 'for visitors’ entertainment rather than the animals’ good'],
            }),
          ],
        }),
      ],
    }),
    recall({
      seconds: 260,
      lines: 12,
      stem: `Read the two extracts about telephones at the dinner table.

**Source A** I am not asking for much. Twenty minutes. One meal in which nobody’s pocket buzzes and my daughter’s eyes meet mine. We did not invite four hundred strangers to dinner, yet there they sit, glowing beside the salt.

**Source B** My gran is nine hundred miles away, and every Sunday we prop her up against the water jug and pass her the news with the potatoes. She laughs, she interrupts, she tells me to sit up. Take the phone off that table and you take a chair away from it.

Compare how the writers present their different views of telephones at meals.`,
      points: [
        'Source A’s view: telephones intrude on family meals or come between people',
        'Source B’s view: telephones can bring an absent relative to the meal',
        point('Supports both views with short quotations', { reject: ['quotations from one source only'] }),
        point(
          'Comments on a method in Source A, such as the short sentences or the image of “strangers” who “sit, glowing beside the salt”',
          {
            allow: ['hyperbole in “four hundred strangers”'],
          },
        ),
        point('Comments on a method in Source B, such as the list of verbs or the metaphor of taking a chair away', {
          allow: ['“her” for the telephone treats it as the grandmother herself', 'anecdote'],
        }),
        point(
          'Makes an explicit comparison, for instance that both treat the telephone as a guest, one unwelcome and the other loved',
          {
            allow: ['any clear link of view or method using a connective'],
          },
        ),
      ],
      model:
        'The writer of Source A thinks telephones intrude on family life: they are “four hundred strangers” who “sit, glowing beside the salt”. The exaggeration and the image of uninvited guests make the phone seem rude. In contrast, Source B believes a phone can bring a family together, as the gran is “nine hundred miles away” but is passed “the news with the potatoes”. The list “She laughs, she interrupts, she tells me to sit up” makes her seem present, and the final metaphor of taking “a chair away” presents the phone as a member of the family. Both writers therefore treat the phone as a guest, but for one it is unwelcome and for the other it is loved.',
      guidance:
        'Deal with both writers in every paragraph: view, evidence and method for one, then the same for the other, joined by a connective.',
    }),
    recall({
      seconds: 110,
      lines: 6,
      stem: 'State four things that a strong paragraph comparing two writers’ viewpoints should contain.',
      points: [
        point('What each writer thinks or feels', { allow: ['the attitude of both writers'] }),
        point('A short quotation or reference from each text', { reject: ['a quotation from one text only'] }),
        point('Comment on the methods each writer uses', { allow: ['language', 'tone', 'structure'] }),
        point('A comparison made explicit, with a connective such as *whereas*', {
          allow: ['a similarity made explicit'],
        }),
      ],
      model:
        'It should say what each writer thinks, support this with a short quotation from each text, comment on the methods each writer uses, and make the comparison explicit with a word such as “whereas”.',
    }),
  ],
};

export const textTopics: TopicContent[] = [structure, summary, comparison];
