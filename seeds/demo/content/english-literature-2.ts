import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const jekyllPlot: TopicContent = {
  number: '7',
  title: 'Jekyll and Hyde: plot and character',
  weights: { 2: 18 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Name each character in *The Strange Case of Dr Jekyll and Mr Hyde*.',
      parts: [
        part({
          prompt: 'The lawyer who investigates Hyde',
          answer: exactly(
            ['Utterson', 'Mr Utterson', 'Gabriel Utterson', 'Gabriel John Utterson', 'Mr. Utterson', 'Gabriel'],
            ['Enfield', 'Lanyon', 'Poole', 'Guest'],
          ),
          model: 'Mr Utterson',
          points: [point('(Mr) Utterson', { reject: ['Enfield'] })],
        }),
        part({
          prompt: 'The Member of Parliament whom Hyde murders',
          answer: words('Sir Danvers Carew', 'Danvers Carew', 'Carew', 'Sir Danvers', 'Danvers', 'Sir Carew'),
          model: 'Sir Danvers Carew',
          points: ['(Sir Danvers) Carew'],
        }),
        part({
          prompt: 'The doctor who sees Hyde turn into Jekyll',
          answer: words('Lanyon', 'Dr Lanyon', 'Hastie Lanyon', 'Dr Hastie Lanyon', 'Doctor Lanyon', 'Dr. Lanyon'),
          model: 'Dr Lanyon',
          points: ['(Dr) Lanyon'],
        }),
      ],
    }),
    short({
      seconds: 45,
      lines: 2,
      stem: 'In the first chapter of *Jekyll and Hyde*, what does Hyde do to the young girl he meets in the street?',
      answer: wording(
        'he tramples her',
        'tramples her',
        'he tramples on her',
        'he trampled her',
        'he trampled on her',
        'he tramples over her',
        'tramples over her',
        'he tramples calmly over her body',
        'he trampled calmly over her body',
        'he walks over her',
        'he walks on her',
        'he steps on her',
        'he knocks her down and tramples her',
        'he knocks her over and tramples on her',
      ),
      model: 'he tramples over her',
      points: [
        point('He tramples over her', {
          allow: ['walks over her and leaves her screaming on the ground'],
          reject: ['he murders her'],
        }),
      ],
      guidance: 'Enfield’s word *calmly* is what makes the act so disturbing.',
    }),
    short({
      seconds: 35,
      stem: 'In *Jekyll and Hyde*, name the servant who fetches Utterson and helps him to break down the door of the cabinet.',
      answer: exactly(['Poole', 'Mr Poole', 'Pool'], ['Bradshaw', 'Guest', 'Enfield']),
      model: 'Poole',
      points: [point('Poole', { reject: ['Bradshaw', 'Guest'] })],
      guidance: 'Poole is Jekyll’s butler. Guest is Utterson’s clerk, who notices the likeness of the handwriting.',
    }),
    short({
      seconds: 40,
      stem: 'In *Jekyll and Hyde*, what does Hyde use to beat Carew to death?',
      answer: words(
        'cane',
        'a cane',
        'his cane',
        'walking stick',
        'a walking stick',
        'his walking stick',
        'a walking cane',
        'stick',
        'a stick',
        'a heavy cane',
        'heavy cane',
        "Jekyll's cane",
        'a cane given to Jekyll by Utterson',
      ),
      model: 'a heavy cane',
      points: [point('A (heavy) cane', { allow: ['walking stick'] })],
      guidance: 'The cane is a clue: Utterson recognises it as one he gave to Jekyll.',
    }),
    recall({
      seconds: 160,
      lines: 8,
      stem: 'Describe how Jekyll gradually loses control over Hyde, as he explains it in the last chapter of *Jekyll and Hyde*.',
      points: [
        point('At first he becomes Hyde when he chooses, by drinking the potion', { allow: ['he enjoys the freedom'] }),
        point('He wakes one morning as Hyde without having taken the potion', {
          allow: ['he sees Hyde’s hand on the bedclothes'],
        }),
        point('He gives Hyde up for a time but gives in, and Hyde comes out stronger and murders Carew', {
          allow: ['after about two months'],
        }),
        point('He begins to change without the potion even when awake, and can no longer obtain the salt he needs', {
          allow: ['he changes on a bench in Regent’s Park', 'new supplies of the salt do not work'],
        }),
      ],
      model:
        'At first Jekyll turns into Hyde only when he drinks the potion, and he enjoys the freedom it gives. Then he wakes one morning to find that he has become Hyde in his sleep. He gives Hyde up for two months, but gives in to temptation, and Hyde breaks out more violently than ever and murders Carew. Later he changes in daylight in Regent’s Park without the potion, and when the salt runs out he cannot make the drug again.',
      guidance: 'Put the stages in order: choice, waking as Hyde, giving in, changing without the drug.',
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: 'How does Stevenson present Mr Utterson in *Jekyll and Hyde*, and why is he a useful character through whom to tell the story?',
      points: [
        point('He is reserved, serious or respectable', {
          allow: ['“a man of a rugged countenance”', 'self-controlled', 'austere'],
        }),
        point('He is loyal to friends and slow to judge others', {
          allow: ['he tries to protect Jekyll’s reputation'],
        }),
        point('He looks for rational explanations, so he misses or delays the truth', {
          allow: ['he thinks Jekyll is being blackmailed'],
        }),
        point('We know only what he discovers, so mystery or suspense is kept up', {
          allow: ['the reader becomes a detective with him'],
        }),
      ],
      model:
        'Utterson is a reserved, respectable lawyer who is loyal to his friends and slow to judge them. He looks for rational explanations and suspects that Hyde is blackmailing Jekyll. Because the reader mostly knows only what Utterson finds out, the secret is kept until the end and the story works as a mystery.',
    }),
  ],
};

const jekyllThemes: TopicContent = {
  number: '8',
  title: 'Jekyll and Hyde: themes and context',
  weights: { 2: 16 },
  questions: [
    short({
      seconds: 35,
      stem: 'In which year was *The Strange Case of Dr Jekyll and Mr Hyde* first published?',
      answer: num(1886),
      model: '1886',
      points: ['1886'],
    }),
    short({
      seconds: 40,
      stem: r`Write the missing word in this quotation from *Jekyll and Hyde*.

> “… man is not truly one, but truly ______.”`,
      answer: exactly(['two', '2'], ['one', 'many', 'evil', 'too', 'to', 'none']),
      model: 'two',
      points: ['two'],
      guidance: 'Jekyll’s conclusion states the theme of duality that the whole novella is built on.',
    }),
    short({
      seconds: 45,
      stem: 'Utterson says of Hyde, “Something troglodytic, shall we say?” What is a troglodyte?',
      answer: wording(
        'a cave dweller',
        'a cave-dweller',
        'cave dweller',
        'cave-dweller',
        'a caveman',
        'caveman',
        'a cave man',
        'someone who lives in a cave',
        'a person who lives in a cave',
        'a primitive person who lives in a cave',
        'a prehistoric cave dweller',
      ),
      model: 'a cave-dweller',
      points: [point('A cave-dweller', { allow: ['a primitive human being'], reject: ['a troll', 'an animal'] })],
    }),
    short({
      seconds: 45,
      stem: '*Jekyll and Hyde* is often placed in a genre that uses fear, mystery, the supernatural and dark or isolated settings, and that shares its name with a style of medieval architecture. Name this genre.',
      answer: words(
        'Gothic',
        'Gothic fiction',
        'Gothic horror',
        'the Gothic',
        'Gothic novel',
        'Gothic genre',
        'Gothic literature',
        'urban Gothic',
      ),
      model: 'Gothic',
      points: [point('Gothic (fiction)', { reject: ['horror, alone', 'science fiction', 'detective fiction'] })],
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: 'Explain how *Jekyll and Hyde* reflects Victorian anxieties about evolution.',
      points: [
        point('Darwin’s *On the Origin of Species* (1859) suggested that species develop from earlier forms', {
          allow: ['that human beings share ancestors with animals'],
        }),
        point('Victorians feared that people could degenerate, or go back to a more primitive state', {
          allow: ['devolution'],
        }),
        point('Hyde is described as an animal or as primitive, for example “ape-like fury” or “troglodytic”', {
          allow: ['“hardly human”'],
        }),
      ],
      model:
        'Darwin’s On the Origin of Species, published in 1859, suggested that species develop from earlier forms, and many Victorians feared that people could slip back into a more primitive state. Stevenson describes Hyde as “hardly human” and says that he attacks Carew with “ape-like fury”, so he seems to be the animal hidden in a civilised man.',
      guidance: 'Context earns marks only when it is tied to words from the novella.',
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: 'Explain how Stevenson uses setting in *Jekyll and Hyde* to present the theme of duality or concealment.',
      points: [
        point('The front of Jekyll’s house is handsome and respectable', {
          allow: ['“wore a great air of wealth and comfort”'],
        }),
        point('The door that Hyde uses is neglected: “blistered and distained”', {
          allow: ['no bell or knocker', 'windowless'],
        }),
        point('They belong to one building, as Jekyll and Hyde belong to one man', {
          allow: ['a symbol of Jekyll’s double life'],
        }),
        point('Fog or darkness in London hides what people do', {
          allow: ['night scenes', 'locked doors and the locked cabinet'],
        }),
      ],
      model:
        'The front of Jekyll’s house is handsome, but the door that Hyde uses at the back is “blistered and distained” and has neither bell nor knocker. Because both belong to one building, the house stands for a man with a respectable face and a hidden life. Fog and darkness hang over London, so that crimes can be concealed in a respectable city.',
      guidance: 'Say what the setting stands for. A description of the door without the idea behind it earns one mark.',
    }),
    recall({
      seconds: 100,
      lines: 5,
      stem: 'Explain why reputation matters to the gentlemen in *Jekyll and Hyde*. Refer to one detail from the novella.',
      points: [
        point('A Victorian gentleman’s position depended on appearing respectable', {
          allow: ['scandal could ruin him'],
        }),
        point('So wrongdoing is kept secret rather than admitted', { allow: ['friends do not ask questions'] }),
        point('A detail, such as Enfield’s rule “the more it looks like Queer Street, the less I ask”', {
          allow: [
            'Jekyll creates Hyde to hide his pleasures',
            'Utterson keeps the letter quiet',
            'the cheque paid to avoid scandal',
          ],
        }),
      ],
      model:
        'A Victorian gentleman’s place in society depended on looking respectable, so wrongdoing had to be hidden. Enfield says that “the more it looks like Queer Street, the less I ask”, and Jekyll creates Hyde so that he can enjoy himself without losing his good name.',
    }),
  ],
};

const power: TopicContent = {
  number: '9',
  title: 'Poems of power',
  weights: { 2: 18 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Name the poet who wrote each poem.',
      parts: [
        part({
          prompt: '*Ozymandias*',
          answer: exactly(
            ['Percy Bysshe Shelley', 'Shelley', 'Percy Shelley', 'P. B. Shelley', 'P B Shelley', 'PB Shelley'],
            ['Mary Shelley', 'Byron', 'Keats'],
          ),
          model: 'Percy Bysshe Shelley',
          points: [point('(Percy Bysshe) Shelley', { reject: ['Mary Shelley'] })],
        }),
        part({
          prompt: '*London*, which begins “I wander thro’ each charter’d street”',
          answer: exactly(['William Blake', 'Blake'], ['Wordsworth', 'William Wordsworth']),
          model: 'William Blake',
          points: [point('(William) Blake', { reject: ['Wordsworth'] })],
        }),
        part({
          prompt: '*My Last Duchess*',
          answer: exactly(
            ['Robert Browning', 'Browning'],
            ['Elizabeth Barrett Browning', 'Elizabeth Browning', 'Barrett Browning'],
          ),
          model: 'Robert Browning',
          points: [point('(Robert) Browning', { reject: ['Elizabeth Barrett Browning'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: r`Write the missing word in this line from Shelley’s *Ozymandias*.

> “Look on my Works, ye Mighty, and ______!”`,
      answer: words('despair'),
      model: 'despair',
      points: ['despair'],
      guidance:
        'Ozymandias meant rivals to despair at his greatness. Now that only wreckage is left, the word means something else.',
    }),
    short({
      seconds: 40,
      stem: 'In *My Last Duchess*, the Duke speaks throughout to an envoy whose replies we never hear. State the term for this form of poem.',
      answer: exactly(
        ['dramatic monologue', 'a dramatic monologue', 'dramatic monolog'],
        ['soliloquy', 'sonnet', 'ballad', 'dramatic dialogue'],
      ),
      model: 'dramatic monologue',
      points: [point('Dramatic monologue', { reject: ['monologue, alone', 'soliloquy', 'sonnet'] })],
    }),
    short({
      seconds: 50,
      stem: r`Read these lines from Blake’s *London*.

> “In every cry of every Man,\
> In every Infants cry of fear,\
> In every voice: in every ban,\
> The mind-forg’d manacles I hear”

Name the technique by which one word is used again and again in the first three lines.`,
      answer: words(
        'repetition',
        'anaphora',
        'repeating',
        'repetition of every',
        'repetition of the word every',
        'repeated words',
        'repeated word',
        'repeated',
        'repeats',
        'repetitive',
        'repetitive language',
        'anaphoric',
      ),
      model: 'repetition',
      points: [point('Repetition', { allow: ['anaphora'] })],
      guidance: 'The repeated *every* leaves no one out: the suffering is everywhere and touches all.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain how Shelley presents the power of a ruler as temporary in *Ozymandias*.',
      points: [
        point(
          'The statue is broken or incomplete, for example “two vast and trunkless legs of stone” or a “shattered visage”',
          {
            allow: ['“colossal Wreck”'],
          },
        ),
        point('The inscription boasts of great works, but “Nothing beside remains”', {
          allow: ['the boast is now ironic'],
        }),
        point('The endless desert suggests that nature or time outlasts power', {
          allow: ['“the lone and level sands stretch far away”'],
        }),
      ],
      model:
        'The statue of the king is ruined: only “two vast and trunkless legs of stone” and a “shattered visage” are left. The inscription orders the mighty to look on his works, but “Nothing beside remains”, so the boast has become ironic. “The lone and level sands stretch far away”, which suggests that time and nature last longer than any ruler.',
      guidance: 'Set what the king says beside what the traveller sees. The irony lies between the two.',
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: r`Read these lines from Blake’s *London*.

> “In every voice: in every ban,\
> The mind-forg’d manacles I hear”

Explain the effect of the phrase “mind-forg’d manacles”.`,
      points: [
        point('It is a metaphor: manacles are chains or handcuffs', { reject: ['real chains in a prison'] }),
        point('It suggests that the people are trapped or oppressed', { allow: ['they have no freedom'] }),
        point('“Mind-forg’d” suggests that the chains are mental, made by fear, by ideas or by those in power', {
          allow: ['people accept their own oppression'],
        }),
      ],
      model:
        'The phrase is a metaphor. Manacles are chains for the wrists, so the people of London seem to be prisoners. “Mind-forg’d” suggests that these chains are made in the mind: people are held down by fear and by the ideas that powerful institutions teach them, and may not even try to break free.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain how Browning shows the Duke’s need for control in *My Last Duchess*.',
      points: [
        point('He controls who sees the portrait: “none puts by / The curtain I have drawn for you, but I”', {
          allow: ['he treats her as a possession'],
        }),
        point('He resented his wife’s smiles or kindness to others, because he was not treated as special', {
          allow: ['“as if she ranked / My gift of a nine-hundred-years-old name / With anybody’s gift”'],
        }),
        point('“I gave commands; / Then all smiles stopped together” implies that he had her killed or silenced', {
          allow: ['a sinister understatement'],
        }),
      ],
      model:
        'The Duke decides who may look at the portrait, saying that “none puts by / The curtain I have drawn for you, but I”. He resented his wife because she smiled at everyone and did not treat his name as special. The calm statement “I gave commands; / Then all smiles stopped together” implies that he had her killed, and now he controls her completely, as a painting.',
      guidance: 'Say what each quotation lets slip about the Duke. He does not call himself controlling.',
    }),
  ],
};

const war: TopicContent = {
  number: '10',
  title: 'Poems of war',
  weights: { 2: 12 },
  questions: [
    shortParts({
      seconds: 60,
      stem: 'These questions are about *The Charge of the Light Brigade*.',
      parts: [
        part({
          prompt: 'Name the poet.',
          answer: words(
            'Tennyson',
            'Alfred Tennyson',
            'Alfred, Lord Tennyson',
            'Alfred Lord Tennyson',
            'Lord Tennyson',
            'Lord Alfred Tennyson',
          ),
          model: 'Alfred, Lord Tennyson',
          points: ['Tennyson'],
        }),
        part({
          prompt: 'Name the war in which the charge took place.',
          answer: exactly(
            ['Crimean War', 'the Crimean War', 'Crimean', 'Crimea', 'war in the Crimea'],
            ['Boer War', 'First World War', 'Napoleonic Wars'],
          ),
          model: 'Crimean War',
          points: [point('The Crimean War', { reject: ['Balaclava, which is the battle'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: r`Write the missing word in these lines from *The Charge of the Light Brigade*.

> “Theirs not to reason why,\
> Theirs but to do and ______.”`,
      answer: exactly(['die'], ['do', 'fight', 'dye', 'try']),
      model: 'die',
      points: ['die'],
    }),
    short({
      seconds: 45,
      stem: 'In *Exposure*, Wilfred Owen writes of “the merciless iced east winds that knive us”. Name the technique by which the winds are made to attack the soldiers as a human enemy would.',
      answer: words(
        'personification',
        'personified',
        'personifying the wind',
        'personification of the wind',
        'personification of the winds',
        'personifying',
        'personify',
        'personifies',
        'anthropomorphism',
      ),
      model: 'personification',
      points: [
        point('Personification', { allow: ['anthropomorphism'], reject: ['simile', 'onomatopoeia', 'metaphor'] }),
      ],
      guidance: 'The choice matters: in this poem the weather, rather than an army, is the enemy.',
    }),
    short({
      seconds: 35,
      stem: r`Write the missing word in the refrain of Owen’s *Exposure*.

> “But nothing ______.”`,
      answer: words('happens'),
      model: 'happens',
      points: ['happens'],
    }),
    recall({
      seconds: 160,
      lines: 8,
      stem: 'Explain how Wilfred Owen presents the reality of war in *Dulce et Decorum Est*. Refer to two details.',
      points: [
        point('The soldiers are exhausted or broken, not heroic, as in “Bent double, like old beggars under sacks”', {
          allow: ['“coughing like hags”', '“blood-shod”'],
        }),
        point('Comments on the language of this detail, such as the simile making young men seem old, poor or ill', {
          ignore: ['the technique named without comment'],
        }),
        point(
          'The gas attack is horrifying, as in “the white eyes writhing in his face” or “as under a green sea, I saw him drowning”',
          {
            allow: ['“guttering, choking, drowning”'],
          },
        ),
        point('Calls it “the old Lie” that it is sweet and fitting to die for one’s country', {
          allow: ['Owen attacks those who glorify war'],
        }),
      ],
      model:
        'Owen shows the soldiers as worn out: “Bent double, like old beggars under sacks”. The simile makes young men seem old and poor, the opposite of heroes. A man who is gassed has “white eyes writhing in his face”, so that death in war is shown as agony. Owen ends by calling it “the old Lie” that it is sweet and fitting to die for one’s country.',
      guidance: 'Choose two moments and write about the words in each: the march, the gas, or the last lines.',
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: r`Read these lines from *The Charge of the Light Brigade*.

> “Half a league, half a league,\
> Half a league onward,\
> All in the valley of Death\
> Rode the six hundred.”

Explain how Tennyson uses rhythm, repetition and imagery in these lines.`,
      points: [
        point('The strong rhythm suggests galloping horses or marching', { allow: ['dactylic rhythm', 'a drum beat'] }),
        point('The repetition of “half a league” suggests the relentless advance, or how far they have to go', {
          allow: ['they cannot turn back'],
        }),
        point('“The valley of Death” makes death seem certain', {
          allow: ['echo of Psalm 23', 'metaphor for the battlefield'],
        }),
      ],
      model:
        'The strong, falling rhythm imitates the sound of galloping horses. “Half a league” is said three times, so the advance feels relentless and the distance long. The phrase “the valley of Death” echoes the Bible and makes the men’s deaths seem certain from the start.',
    }),
  ],
};

const ALLOTMENT = r`> My grandfather’s spade still stands\
> where he left it, upright in the bean row,\
> its handle worn to the shape of his hands.\
> Nobody has moved it. The weeds know\
> there is no one now to be afraid of.\
> I came to clear the plot and lock the shed.\
> Instead I kneel and do the thing he loved:\
> I thin the seedlings, row by row, and tread\
> the soil back firm, the way he showed me how,\
> and hear him, plain as rain, say *Gently now*.`;

const unseen: TopicContent = {
  number: '11',
  title: 'Unseen poetry',
  weights: { 2: 20 },
  questions: [
    shortParts({
      seconds: 130,
      stem: `Read the poem *Allotment*.

${ALLOTMENT}`,
      parts: [
        part({
          prompt: 'What had the speaker come to do? Give one thing.',
          answer: wording(
            'clear the plot',
            'to clear the plot',
            'clear the allotment',
            'to clear the allotment',
            'lock the shed',
            'to lock the shed',
            'clear the plot and lock the shed',
            'to clear the plot and lock the shed',
          ),
          model: 'clear the plot',
          points: [point('Clear the plot, or lock the shed', { reject: ['thin the seedlings'] })],
        }),
        part({
          prompt: 'State the term for the pair of rhyming lines that ends the poem.',
          answer: exactly(
            ['couplet', 'a couplet', 'rhyming couplet', 'a rhyming couplet', 'rhyming couplets'],
            ['stanza', 'quatrain', 'triplet'],
          ),
          model: 'rhyming couplet',
          points: [point('(Rhyming) couplet', { reject: ['quatrain', 'stanza'] })],
        }),
        part({
          prompt: 'State the term for the kind of comparison made in “plain as rain”.',
          answer: exactly(['simile', 'a simile', 'similes'], ['metaphor', 'personification', 'analogy']),
          model: 'simile',
          points: [point('Simile', { reject: ['metaphor'] })],
        }),
      ],
      guidance:
        'Read the whole poem before you answer. The word *Instead* marks the turn: the speaker came for one thing and does another.',
    }),
    short({
      seconds: 50,
      stem: r`Read these lines, from a poem about a grandfather’s allotment.

> Nobody has moved it. The weeds know\
> there is no one now to be afraid of.

Name the technique used to describe the weeds.`,
      answer: exactly(
        [
          'personification',
          'personified',
          'the weeds are personified',
          'personifying',
          'personify',
          'personifies',
          'anthropomorphism',
        ],
        ['metaphor', 'simile', 'pathetic fallacy'],
      ),
      model: 'personification',
      points: [
        point('Personification', { allow: ['anthropomorphism'], reject: ['pathetic fallacy', 'simile', 'metaphor'] }),
      ],
    }),
    short({
      seconds: 50,
      lines: 2,
      stem: r`Read these lines, from a poem about a grandfather who has died.

> My grandfather’s spade still stands\
> where he left it, upright in the bean row,\
> its handle worn to the shape of his hands.

What does the last of these lines suggest about the grandfather? Give one idea.`,
      answer: wording(
        'he used the spade for many years',
        'he used it for many years',
        'he used it a lot',
        'he used it for a long time',
        'he used the spade a lot',
        'he worked hard',
        'he was hard-working',
        'he was hardworking',
        'hard-working',
        'hardworking',
        'he spent a lot of time gardening',
        'he spent many years gardening',
        'he loved gardening',
        'he had dug for years',
        'he has left his mark',
        'part of him is still there',
      ),
      model: 'he used the spade for many years',
      points: [
        point('He used the spade for many years, or worked hard', {
          allow: ['something of him remains', 'he loved his garden'],
          reject: ['his hands were worn'],
        }),
      ],
    }),
    recall({
      seconds: 220,
      lines: 10,
      stem: `Read the poem *Allotment*.

${ALLOTMENT}

How does the poet present the speaker’s feelings about the grandfather?`,
      points: [
        point('Identifies a feeling, such as love, grief, respect or closeness', { allow: ['missing him'] }),
        point(
          'Supports it with a detail, such as the handle “worn to the shape of his hands” or “do the thing he loved”',
          {
            ignore: ['a long quotation with no comment'],
          },
        ),
        point(
          'Comments on the effect of language, such as the worn handle keeping the grandfather’s shape, or “plain as rain” making his voice natural and clear',
          {
            allow: ['the weeds personified as no longer afraid'],
          },
        ),
        point(
          'Comments on form or structure, such as the turn at “Instead”, the closing couplet, or ending on his words',
          {
            allow: ['short sentence “Nobody has moved it”', 'enjambment'],
          },
        ),
      ],
      model:
        'The speaker misses the grandfather and feels close to him. The spade has a handle “worn to the shape of his hands”, so it seems to keep his shape although he is gone. “Plain as rain” makes his remembered voice sound natural, as if it belonged to the garden. The poem turns at “Instead”, when the speaker gives up clearing the plot and carries on his work, and it ends on his words, “Gently now”, which suggests that he is still teaching and comforting the speaker.',
      guidance: 'Feeling, evidence, language, structure: a point for each. Name a feeling before you name a technique.',
    }),
    recall({
      seconds: 240,
      lines: 10,
      stem: `Read the two poems about the death of a relative.

**Allotment**

${ALLOTMENT}

**Clearing Out**

${r`> We boxed her coats. We swept. By noon\
> the rooms were anyone’s, and bare.\
> I shut the door on it so soon\
> I left her voice behind in there.`}

Compare how the two poets present what is left behind after a death.`,
      points: [
        point('Similarity: both speakers come to clear a place that belonged to the person', {
          allow: ['both hear or think of a voice'],
        }),
        'Difference: in *Allotment* the grandfather’s presence remains and comforts; in *Clearing Out* the rooms are emptied and the voice is lost',
        point(
          'Comments on a method in *Allotment*, such as the spade, the speech at the end or the turn at “Instead”',
          {
            allow: ['present tense', 'personified weeds'],
          },
        ),
        point(
          'Comments on a method in *Clearing Out*, such as short sentences like “We swept” or the word “anyone’s”',
          {
            allow: ['four brisk lines suggest haste', 'past tense'],
          },
        ),
      ],
      model:
        'Both speakers have come to clear a place after a relative’s death, but they find different things. In Allotment the grandfather still seems present: his voice says “Gently now”, and ending on his words is comforting. In Clearing Out the short sentences “We boxed her coats. We swept.” sound hurried and cold, and the rooms become “anyone’s”, as though she had never lived there. The first speaker finds the voice again, while the second leaves it behind and regrets it.',
      guidance: 'Compare in every sentence you can. *Both … but …* is a useful shape.',
    }),
  ],
};

export const paperTwoTopics: TopicContent[] = [jekyllPlot, jekyllThemes, power, war, unseen];
