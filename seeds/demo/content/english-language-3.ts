import { part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const viewpointWriting: TopicContent = {
  number: '7',
  title: 'Viewpoint writing',
  weights: { 2: 20 },
  questions: [
    short({
      seconds: 35,
      stem: `Name the persuasive technique in this sentence.

> Who would choose to breathe this air?`,
      answer: words(
        'rhetorical question',
        'a rhetorical question',
        'rhetorical',
        'rhetorical questioning',
        'rhetorical questions',
        'rhetoric question',
      ),
      model: 'rhetorical question',
      points: [point('Rhetorical question', { reject: ['question, alone'] })],
    }),
    shortParts({
      seconds: 110,
      stem: 'Name the persuasive technique used in each sentence.',
      parts: [
        part({
          prompt: 'The new buses will be cleaner, faster and safer.',
          answer: wording(
            'rule of three',
            'rule of 3',
            'list of 3',
            'power of 3',
            'group of 3',
            'tripling',
            'triples',
            'triadic list',
            'the rule of three',
            'triple',
            'triplet',
            'triplets',
            'tricolon',
            'triad',
            'list of three',
            'power of three',
            'three-part list',
            'group of three',
            'triadic structure',
          ),
          model: 'rule of three',
          points: [point('Rule of three', { allow: ['triplet', 'tricolon', 'list of three'] })],
        }),
        part({
          prompt: 'You know how that crossing feels at eight in the morning.',
          answer: wording(
            'direct address',
            'second person',
            'second-person address',
            'second person address',
            'use of second person',
            'second person pronoun',
            'personal pronoun',
            'addressing the reader directly',
            'addressing the reader',
          ),
          model: 'direct address',
          points: [point('Direct address', { allow: ['second person'], reject: ['first person'] })],
        }),
        part({
          prompt: 'Last winter I sat in that waiting room for nine hours with a broken wrist.',
          answer: wording(
            'anecdote',
            'anecdotes',
            'personal story',
            'personal anecdote',
            'an anecdote',
            'anecdotal evidence',
            'personal experience',
            'anecdotal',
          ),
          model: 'anecdote',
          points: [point('Anecdote', { allow: ['personal experience'] })],
        }),
      ],
    }),
    short({
      seconds: 45,
      stem: 'In a speech, a writer says: “Some will say that a youth club costs too much. It costs less than the damage done by having none.” State the term for an opposing point that a writer raises in order to answer it.',
      answer: {
        kind: 'text',
        accept: [
          'counter-argument',
          'counterargument',
          'counter argument',
          'counter-arguments',
          'counterclaim',
          'counter-claim',
          'counter claim',
          'counterpoint',
          'counter-point',
        ],
        reject: ['argument', 'rhetorical question', 'rebuttal', 'anecdote'],
        unlisted: 'selfMark',
      },
      model: 'counter-argument',
      points: [
        point('Counter-argument', {
          allow: ['counter-claim'],
          reject: ['argument, alone', 'rebuttal, which is the answer to it'],
        }),
      ],
      guidance: 'Raising the objection yourself lets you choose the answer to it. Follow it at once with your reply.',
    }),
    short({
      seconds: 40,
      stem: 'A formal letter begins “Dear Ms Adeyemi”. Write the two-word closing phrase that should come before the signature.',
      answer: exactly(['Yours sincerely', 'Yours sincerely,'], ['Yours faithfully', 'Yours truly', 'Kind regards']),
      model: 'Yours sincerely',
      points: [point('Yours sincerely', { reject: ['Yours faithfully'] })],
      guidance: 'A named person takes *sincerely*; *Dear Sir or Madam* takes *faithfully*.',
    }),
    recall({
      seconds: 150,
      lines: 6,
      stem: `Rewrite this sentence as a short paragraph for a speech to your local council. Use two different persuasive techniques.

> The park should not be built on because people use it.`,
      points: [
        point('Keeps the argument: the park should be saved because it is used', {
          allow: ['examples of who uses it'],
        }),
        point('Uses one persuasive technique effectively, such as a rhetorical question or direct address', {
          ignore: ['a technique named but not used'],
        }),
        'Uses a second, different technique effectively, such as the rule of three, anecdote or emotive language',
        point('Is accurate in spelling, punctuation and sentence structure', { allow: ['one minor slip'] }),
      ],
      model:
        'Councillors, where did you learn to ride a bicycle? My own daughter learned last spring on the path you now plan to cover with concrete. This park is used by toddlers, by runners and by neighbours who have no other garden. Please do not build on it.',
      guidance:
        'Techniques earn marks when they serve the argument. Decide what the listener should feel, then choose the technique that does it.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'State three conventions of form that a broadsheet newspaper article usually follows and that a letter does not.',
      points: [
        point('A headline', { ignore: ['a title in capital letters'] }),
        point('A strapline or standfirst under the headline, which introduces the subject', {
          allow: ['by-line naming the writer'],
        }),
        point(
          'An opening paragraph that gives the main point or story, with subheadings or short paragraphs to follow',
          {
            allow: ['subheadings'],
          },
        ),
      ],
      model:
        'An article has a headline and a strapline beneath it that introduces the subject. Its first paragraph gives the main point, and subheadings may divide the paragraphs that follow.',
    }),
  ],
};

const creativeWriting: TopicContent = {
  number: '8',
  title: 'Descriptive and narrative writing',
  weights: { 1: 14 },
  questions: [
    shortParts({
      seconds: 90,
      stem: 'State which of the five senses each description appeals to most.',
      parts: [
        part({
          prompt: 'the sour reek of wet coal',
          answer: words('smell', 'smells', 'smelling', 'sense of smell', 'olfactory', 'the nose', 'scent', 'odour'),
          model: 'smell',
          points: [point('Smell', { reject: ['taste'] })],
        }),
        part({
          prompt: 'the thin hum of wires overhead',
          answer: words(
            'hearing',
            'sound',
            'sounds',
            'auditory',
            'aural',
            'sense of hearing',
            'sense of sound',
            'audible',
            'hear',
            'listening',
            'the ears',
          ),
          model: 'hearing',
          points: [point('Hearing', { allow: ['sound'], reject: ['sight'] })],
        }),
        part({
          prompt: 'the iron rail, cold and gritty beneath her palm',
          answer: words('touch', 'touching', 'sense of touch', 'tactile', 'feel', 'feeling', 'feelings', 'the hands'),
          model: 'touch',
          points: [point('Touch', { allow: ['feeling'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'State the term for an expression so overused that it has lost its force, such as *the calm before the storm*.',
      answer: exactly(
        [
          'cliché',
          'cliche',
          'a cliché',
          'clichés',
          'cliches',
          'clichéd',
          'clichéd phrase',
          'hackneyed phrase',
          'hackneyed expression',
          'stock phrase',
        ],
        ['metaphor', 'simile', 'idiom'],
      ),
      model: 'cliché',
      points: [point('Cliché', { allow: ['hackneyed or stock phrase'], reject: ['metaphor', 'idiom'] })],
    }),
    short({
      seconds: 70,
      lines: 2,
      stem: `Rewrite this sentence to *show* the feeling instead of naming it. Do not use the word *nervous*.

> Ade was nervous before the interview.`,
      answer: wording(
        'Ade wiped his palms on his trousers and read the same line of his notes again.',
        'Ade tapped his foot and checked the clock again.',
        "Ade's hands shook as he straightened his tie.",
        'Ade bit his nails and stared at the clock.',
      ),
      model: 'Ade wiped his palms on his trousers and read the same line of his notes again.',
      points: [
        point('Shows nerves through action, speech, appearance or physical sensation, without naming the feeling', {
          allow: ['any suitable action, such as tapping a foot or checking the time'],
          reject: ['another word for nervous, such as anxious or worried'],
        }),
      ],
      guidance: 'Ask what someone watching would see or hear. A synonym for *nervous* still tells.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'You have been asked to describe a railway station at night. Write a four-step plan that gives the description a clear structure.',
      points: [
        point('Opens with a wide view, or an atmosphere that sets the scene', {
          allow: ['the station seen from outside'],
        }),
        'Narrows to one detail or one person',
        point('Includes a shift or contrast: of time, light, sound or mood', {
          allow: ['a train arrives', 'the lights fail'],
        }),
        point('Ends with an image that links back to the opening or shows it changed', {
          ignore: ['“end with a cliffhanger”, with no content'],
        }),
      ],
      model:
        'Begin with the whole station under its glass roof, empty and humming. Move in to one traveller asleep on a bench with a birdcage beside her. Let a train arrive, so that noise and light fill the place for a minute. End with the station silent again, but the bench empty and one feather on the floor.',
      guidance:
        'A description needs movement as well as detail. Plan where the reader’s eye goes before you plan the adjectives.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: `Read this description.

> The beautiful, pretty lake was very blue and very calm and it was really nice and peaceful.

State three ways in which it could be improved, giving an example for at least one of them.`,
      points: [
        point('Replace vague adjectives with precise ones, or with a stronger verb', {
          allow: ['remove “very” and “really”'],
        }),
        point('Cut repetition: *beautiful* and *pretty*, *calm* and *peaceful*', {
          allow: ['vary the sentence structure'],
        }),
        'Add imagery or another sense, such as sound or touch',
        point('Gives an example of an improvement', {
          ignore: ['an example that only swaps one vague word for another'],
        }),
      ],
      model:
        'Vague words such as “nice” should give way to precise ones. The repetition of “beautiful, pretty” and “calm … peaceful” should be cut. Imagery or another sense should be added, for example: “The lake lay like poured glass, and the only sound was an oar, dripping.”',
    }),
  ],
};

const sentences: TopicContent = {
  number: '9',
  title: 'Sentence forms',
  weights: { 1: 8, 2: 6 },
  questions: [
    shortParts({
      seconds: 100,
      stem: 'State whether each sentence is *simple*, *compound* or *complex*.',
      parts: [
        part({
          prompt: 'The rain stopped before noon.',
          answer: exactly(['simple', 'simple sentence', 'a simple sentence'], ['compound', 'complex']),
          model: 'simple',
          points: [point('Simple', { reject: ['short'] })],
        }),
        part({
          prompt: 'The rain stopped and the players came back.',
          answer: exactly(['compound', 'compound sentence', 'a compound sentence'], ['simple', 'complex']),
          model: 'compound',
          points: ['Compound'],
        }),
        part({
          prompt: 'Although the rain had stopped, the pitch was under water.',
          answer: exactly(['complex', 'complex sentence', 'a complex sentence'], ['simple', 'compound']),
          model: 'complex',
          points: ['Complex'],
        }),
      ],
      guidance:
        'Count the clauses. Two main clauses joined by *and*, *but* or *or* make a compound sentence; a clause that cannot stand alone makes it complex.',
    }),
    short({
      seconds: 40,
      stem: `State the type of sentence, by its purpose.

> Shut the gate behind you.`,
      answer: words(
        'imperative',
        'command',
        'imperative sentence',
        'a command',
        'order',
        'an order',
        'directive',
        'instruction',
        'an instruction',
        'instructional',
        'instructive',
        'commanding',
        'demand',
        'ordering',
      ),
      model: 'imperative',
      points: [point('Imperative', { allow: ['command'], reject: ['declarative', 'exclamatory'] })],
    }),
    short({
      seconds: 50,
      stem: `Write down the subordinate clause in this sentence.

> When the siren sounded, every crane on the dock stopped.`,
      answer: exactly(['When the siren sounded', 'When the siren sounded,'], ['every crane on the dock stopped']),
      model: 'When the siren sounded',
      points: [point('When the siren sounded', { reject: ['every crane on the dock stopped'] })],
      guidance:
        'Cover each clause in turn. The one that sounds unfinished alone, *When the siren sounded*, is subordinate.',
    }),
    short({
      seconds: 60,
      lines: 2,
      stem: `Correct the comma splice in this sentence.

> The shop was closed, we walked home.`,
      answer: {
        kind: 'text',
        accept: [
          'The shop was closed. We walked home.',
          'The shop was closed; we walked home.',
          'The shop was closed, so we walked home.',
          'The shop was closed so we walked home.',
          'The shop was closed and we walked home.',
          'The shop was closed, and we walked home.',
          'Because the shop was closed, we walked home.',
          'As the shop was closed, we walked home.',
          'Since the shop was closed, we walked home.',
          'We walked home because the shop was closed.',
        ],
        reject: ['The shop was closed, we walked home.', 'The shop was closed we walked home.'],
        unlisted: 'selfMark',
      },
      model: 'The shop was closed, so we walked home.',
      points: [
        point('Separates or joins the two main clauses correctly: a full stop, a semicolon, or a conjunction', {
          allow: ['a colon or dash'],
          reject: ['taking the comma out and changing nothing else'],
        }),
      ],
      guidance: 'A comma cannot join two main clauses by itself. Stop, use a semicolon, or add a conjunction.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: `Read the extract.

> The water rose past the step, past the sill, past the shelf where the photographs had always stood, until the whole of the lower floor belonged to the river. Nobody spoke.

How does the writer use sentence forms here?`,
      points: [
        point('Identifies the long or complex sentence, or the repetition of “past”', {
          allow: ['listing', 'anaphora'],
        }),
        'Explains that its length or repetition imitates the steady, unstoppable rise of the water',
        point('Identifies the short sentence “Nobody spoke”', { allow: ['simple sentence'] }),
        point('Explains that its abruptness suggests shock, helplessness or silence after the movement', {
          ignore: ['“it creates tension”, unexplained'],
        }),
      ],
      model:
        'The first sentence is long and repeats “past” before each thing the water reaches, which imitates the flood climbing steadily and without a pause. It is followed by the short sentence “Nobody spoke”. The sudden stop lets the reader feel the family’s shock and how helpless they are.',
      guidance: 'Write about the two sentences together. The short one works because of the long one before it.',
    }),
    recall({
      seconds: 90,
      lines: 4,
      stem: 'Give one effect each of these can have in a piece of writing: a one-sentence paragraph, a list of verbs, and a sentence that begins with an adverb.',
      points: [
        point('One-sentence paragraph: isolates an idea so that it stands out', {
          allow: ['shock', 'a dramatic pause'],
        }),
        point('List of verbs: gives pace, energy or a sense of many actions in quick succession', {
          allow: ['chaos', 'busyness'],
        }),
        point('Adverb first: draws attention to the manner or time of the action before the action itself', {
          allow: ['sets the mood', 'delays the action and so builds suspense'],
        }),
      ],
      model:
        'A one-sentence paragraph isolates an idea so that it stands out. A list of verbs gives pace and a sense of hurried action. Beginning with an adverb draws attention to how or when something is done before we learn what it is.',
    }),
  ],
};

const punctuation: TopicContent = {
  number: '10',
  title: 'Punctuation',
  weights: { 1: 7, 2: 7 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Write each phrase with its apostrophe in the right place.',
      parts: [
        part({
          prompt: 'the bowl of one dog: *the dogs bowl*',
          answer: exactly(
            ["the dog's bowl", "dog's bowl", "the dog's", "dog's"],
            ["the dogs' bowl", 'the dogs bowl', "dogs' bowl", 'dogs bowl', "dogs'", 'dogs'],
          ),
          model: "the dog's bowl",
          points: [point('the dog’s bowl', { reject: ['the dogs’ bowl'] })],
        }),
        part({
          prompt: 'the coats of two boys: *the boys coats*',
          answer: exactly(
            ["the boys' coats", "boys' coats", "the boys'", "boys'"],
            [
              "the boy's coats",
              'the boys coats',
              "boy's coats",
              'boys coats',
              "boy's",
              'boys',
              "the boys coat's",
              "the boys' coat's",
            ],
          ),
          model: "the boys' coats",
          points: [point('the boys’ coats', { reject: ['the boy’s coats'] })],
        }),
        part({
          prompt: 'the toys of some children: *the childrens toys*',
          answer: exactly(
            ["the children's toys", "children's toys", "the children's", "children's"],
            [
              "the childrens' toys",
              'the childrens toys',
              "childrens' toys",
              'childrens toys',
              "childrens'",
              'childrens',
            ],
          ),
          model: "the children's toys",
          points: [point('the children’s toys', { reject: ['the childrens’ toys'] })],
        }),
      ],
      guidance:
        'Write the owner first (*dog*, *boys*, *children*), then the apostrophe, then an s if the owner does not already end in one as a plural.',
    }),
    short({
      seconds: 40,
      stem: `Name the punctuation mark missing after *things* in this sentence.

> He took only three things a map, a torch and his sister’s whistle.`,
      answer: exactly(
        ['colon', 'a colon', 'full colon', ':', 'dash', 'a dash', '–'],
        ['semicolon', 'semi-colon', 'semi colon', ';', 'comma', ','],
      ),
      model: 'colon',
      points: [point('Colon', { allow: ['dash'], reject: ['semicolon', 'comma'] })],
      guidance:
        'A colon introduces a list after a clause that could stand alone; a dash can do so in less formal writing. A semicolon separates items or joins equal clauses.',
    }),
    short({
      seconds: 50,
      lines: 2,
      stem: `Rewrite this sentence with two commas, to show that the middle part is extra information.

> My aunt who runs the bakery has won an award.`,
      answer: exactly(
        ['My aunt, who runs the bakery, has won an award.', 'My aunt, who runs the bakery, has won an award'],
        [
          'My aunt who runs the bakery has won an award.',
          'My aunt, who runs the bakery has won an award.',
          'My aunt who runs the bakery, has won an award.',
          'My aunt who, runs the bakery, has won an award.',
        ],
      ),
      model: 'My aunt, who runs the bakery, has won an award.',
      points: [point('Commas after *aunt* and after *bakery*, and nowhere else', { reject: ['one comma only'] })],
      guidance:
        'Take out the words between the commas. What is left, *My aunt has won an award*, must still be a sentence.',
    }),
    recall({
      seconds: 100,
      lines: 5,
      stem: `Read the extract.

> “I only opened it to see whether—” She stopped. In the hall, the clock went on ticking…

Explain the effect of the dash and of the ellipsis.`,
      points: [
        point('The dash shows that the speech is broken off or interrupted', { allow: ['she stops herself'] }),
        point('It suggests guilt, fear or something she will not say', { allow: ['something has startled her'] }),
        point('The ellipsis lets the moment trail on, so that the silence feels long or tense', {
          allow: ['it leaves the scene unresolved'],
          ignore: ['“it is a cliffhanger”, unexplained'],
        }),
      ],
      model:
        'The dash shows her speech breaking off, which suggests that she feels guilty or has been startled. The ellipsis makes the ticking seem to go on, so that the silence after her words feels long and tense.',
    }),
    recall({
      seconds: 100,
      lines: 5,
      stem: 'State three rules for setting out direct speech in a story.',
      points: [
        point('Put the words spoken inside inverted commas', { allow: ['speech marks', 'quotation marks'] }),
        point('Start a new paragraph for each new speaker', { allow: ['new line'] }),
        point('Put the punctuation that ends the speech inside the closing inverted commas', {
          allow: ['begin the speech with a capital letter'],
        }),
      ],
      model:
        'The words spoken go inside inverted commas. A new speaker starts a new paragraph. The punctuation that ends the speech, such as a comma or question mark, comes before the closing inverted commas.',
    }),
  ],
};

const spelling: TopicContent = {
  number: '11',
  title: 'Spelling and homophones',
  weights: { 1: 7, 2: 7 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Write *there*, *their* or *they’re* to complete each sentence.',
      parts: [
        part({
          prompt: '______ waiting outside the hall.',
          answer: exactly(["they're", "They're"], ['there', 'their', 'theyre']),
          model: "they're",
          points: [point('They’re', { reject: ['Their', 'There'] })],
        }),
        part({
          prompt: 'The twins left ______ bags in the hall.',
          answer: exactly(['their'], ['there', "they're", 'theyre', 'thier']),
          model: 'their',
          points: ['their'],
        }),
        part({
          prompt: 'Put the chairs over ______ by the wall.',
          answer: exactly(['there'], ['their', "they're", 'theyre']),
          model: 'there',
          points: ['there'],
        }),
      ],
      guidance: '*They’re* is *they are*; *their* shows belonging; *there* is a place, like *here*.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Choose the correct word in brackets. Use British spelling.',
      parts: [
        part({
          prompt: 'The rain will not (affect / effect) the result.',
          answer: exactly(['affect'], ['effect']),
          model: 'affect',
          points: [point('affect', { reject: ['effect'] })],
        }),
        part({
          prompt: 'I have to (practice / practise) the piano every day.',
          answer: exactly(['practise'], ['practice']),
          model: 'practise',
          points: [point('practise', { reject: ['practice'] })],
        }),
        part({
          prompt: 'The head teacher gave us some good (advice / advise).',
          answer: exactly(['advice'], ['advise']),
          model: 'advice',
          points: [point('advice', { reject: ['advise'] })],
        }),
      ],
      guidance:
        'In British spelling the verb has s (*to practise, to advise*) and the noun has c (*a practice, some advice*). *Affect* is usually the verb and *effect* the noun.',
    }),
    shortParts({
      seconds: 90,
      stem: 'Each sentence contains one misspelt word. Write that word correctly.',
      parts: [
        part({
          prompt: 'It was neccessary to wait for an hour.',
          answer: exactly(
            ['necessary'],
            ['neccessary', 'necesary', 'neccesary', 'necessery', 'nessesary', 'nesessary', 'nessecary'],
          ),
          model: 'necessary',
          points: ['necessary'],
        }),
        part({
          prompt: 'We recieved no reply to our letter.',
          answer: exactly(['received'], ['recieved', 'receved', 'receaved']),
          model: 'received',
          points: ['received'],
        }),
        part({
          prompt: 'They kept the two boxes in seperate rooms.',
          answer: exactly(['separate'], ['seperate', 'separete', 'seprate', 'separat']),
          model: 'separate',
          points: ['separate'],
        }),
      ],
      guidance: '*Necessary*: one c, two s. *Received*: e before i after c. *Separate*: there is *a rat* in it.',
    }),
    shortParts({
      seconds: 70,
      stem: 'Write the plural of each noun.',
      parts: [
        part({
          prompt: 'shelf',
          answer: exactly(['shelves'], ['shelfs', 'shelve', "shelf's"]),
          model: 'shelves',
          points: ['shelves'],
        }),
        part({
          prompt: 'tomato',
          answer: exactly(['tomatoes'], ['tomatos', "tomato's"]),
          model: 'tomatoes',
          points: ['tomatoes'],
        }),
        part({
          prompt: 'story (a tale)',
          answer: exactly(['stories'], ['storys', 'storeys', "story's", 'storeies']),
          model: 'stories',
          points: [point('stories', { reject: ['storeys (floors of a building)'] })],
        }),
      ],
    }),
    recall({
      seconds: 100,
      lines: 5,
      stem: 'Explain why *hopping* has a double p but *hoping* has only one.',
      points: [
        point('*Hop* has a short vowel followed by one consonant', { allow: ['the vowel sound in hop is short'] }),
        'So the consonant is doubled before *-ing*, which keeps the vowel short',
        point('*Hope* has a long vowel and drops its final e before *-ing*', { allow: ['the e is removed'] }),
      ],
      model:
        'Hop ends in one consonant after a short vowel, so the p is doubled before -ing to keep the vowel short. Hope has a long vowel and a final e; the e is dropped before -ing and the p is not doubled.',
    }),
    recall({
      seconds: 70,
      lines: 3,
      stem: 'Explain the difference between *its* and *it’s*.',
      points: [
        point('*Its* shows possession, or means belonging to it', {
          allow: ['a correct example, such as “the dog wagged its tail”'],
        }),
        point('*It’s* is short for *it is* or *it has*', { allow: ['a correct example, such as “it’s raining”'] }),
      ],
      model:
        'Its means belonging to it, as in “the cat licked its paw”. It’s is a contraction of it is or it has, as in “it’s raining”.',
      guidance: 'Say *it is* aloud in the sentence. If it makes sense, the apostrophe belongs there.',
    }),
  ],
};

export const writingTopics: TopicContent[] = [viewpointWriting, creativeWriting, sentences, punctuation, spelling];
