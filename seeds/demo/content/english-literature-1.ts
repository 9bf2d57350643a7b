import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const macbethPlot: TopicContent = {
  number: '1',
  title: 'Macbeth: plot and character',
  weights: { 1: 16 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Answer these questions on *Macbeth*.',
      parts: [
        part({
          prompt: 'Which title does Duncan give Macbeth after the battle at the start of the play?',
          answer: exactly(
            ['Thane of Cawdor', 'Cawdor', 'the Thane of Cawdor'],
            ['Thane of Glamis', 'Glamis', 'Thane of Fife'],
          ),
          model: 'Thane of Cawdor',
          points: [point('Thane of Cawdor', { reject: ['Thane of Glamis'] })],
        }),
        part({
          prompt: 'Whose murder makes Macbeth king?',
          answer: exactly(['Duncan', 'King Duncan', "Duncan's", "King Duncan's"], ['Banquo', 'Malcolm', 'Macduff']),
          model: 'Duncan',
          points: ['Duncan'],
        }),
        part({
          prompt: 'Who kills Macbeth?',
          answer: exactly(['Macduff', 'Thane of Fife', 'Macduff, the Thane of Fife'], ['Malcolm', 'Banquo', 'Siward']),
          model: 'Macduff',
          points: [point('Macduff', { reject: ['Malcolm'] })],
        }),
      ],
    }),
    short({
      seconds: 50,
      lines: 2,
      stem: 'In *Macbeth*, an apparition says that “none of woman born” shall harm Macbeth. Explain why Macduff is able to kill him.',
      answer: wording(
        'he was born by caesarean section',
        'he was born by caesarean',
        'he was born by c-section',
        'caesarean section',
        'c-section',
        "he was cut from his mother's womb",
        'he was cut out of his mother',
        "he was from his mother's womb untimely ripped",
        "he was untimely ripped from his mother's womb",
        'he was not born naturally',
      ),
      model: 'he was born by caesarean section',
      points: [
        point('He was cut from his mother’s womb rather than born naturally', {
          allow: ['“from his mother’s womb untimely ripped”', 'caesarean section'],
          reject: ['he had no mother'],
        }),
      ],
      guidance: 'The apparitions tell truths that mislead. “Born” is the word Macbeth should have questioned.',
    }),
    short({
      seconds: 35,
      stem: 'In *Macbeth*, who escapes when the murderers kill Banquo?',
      answer: exactly(
        ['Fleance', "Banquo's son", 'Fleance, his son', 'his son', 'his son Fleance', "Banquo's son Fleance"],
        ['Malcolm', 'Donalbain', 'Macduff'],
      ),
      model: 'Fleance',
      points: [point('Fleance', { allow: ['Banquo’s son'] })],
    }),
    recall({
      seconds: 140,
      lines: 8,
      stem: 'In Act 4 of *Macbeth*, the Witches show Macbeth three apparitions. Describe what each one tells him and explain how together they affect him.',
      points: [
        point('The armed head tells him to beware Macduff', { allow: ['beware the Thane of Fife'] }),
        point('The bloody child says that none of woman born shall harm him', {
          allow: ['he should be bloody, bold and resolute'],
        }),
        point('The crowned child with a tree says he will not be beaten until Birnam Wood comes to Dunsinane', {
          allow: ['until a wood moves'],
        }),
        point('They give him false confidence, or make him feel that he cannot be beaten', {
          allow: ['he still decides to kill Macduff’s family'],
        }),
      ],
      model:
        'The first apparition, an armed head, tells Macbeth to beware Macduff. The second, a bloody child, says that none of woman born shall harm him. The third, a crowned child holding a tree, says he will not be vanquished until Birnam Wood comes to Dunsinane. Together they make him feel safe and overconfident, because the last two seem impossible.',
    }),
    recall({
      seconds: 170,
      lines: 9,
      stem: 'Explain how Lady Macbeth changes between Act 1 and Act 5 of *Macbeth*. Refer to details from the play.',
      points: [
        point('In Act 1 she is ambitious or forceful and persuades Macbeth to murder Duncan', {
          allow: ['she questions his manhood'],
        }),
        point('Evidence from the early acts, such as “unsex me here” or taking the daggers back herself', {
          allow: ['“look like the innocent flower”'],
        }),
        point('By Act 5 she is overcome by guilt, or has lost control', { allow: ['she walks in her sleep'] }),
        point('Evidence from Act 5, such as “Out, damned spot” or needing a light by her at all times', {
          allow: ['“all the perfumes of Arabia will not sweeten this little hand”'],
        }),
      ],
      model:
        'In Act 1 Lady Macbeth is forceful: she calls on spirits to “unsex me here” and persuades Macbeth to kill Duncan when he wavers. By Act 5 she has lost that control. She walks in her sleep and tries to wash away imaginary blood, crying “Out, damned spot”, which shows that guilt has broken her.',
      guidance:
        'Give one piece of evidence from each end of the play. The change is only clear when both are on the page.',
    }),
  ],
};

const macbethThemes: TopicContent = {
  number: '2',
  title: 'Macbeth: themes and context',
  weights: { 1: 10 },
  questions: [
    short({
      seconds: 35,
      stem: 'Which monarch was on the English throne when *Macbeth* was first performed, in about 1606?',
      answer: exactly(
        [
          'James I',
          'King James I',
          'James the First',
          'King James',
          'James',
          'James VI and I',
          'James VI',
          'James I of England',
          'King James the First',
          'James 1',
          'King James 1',
        ],
        ['Elizabeth I', 'Elizabeth', 'Charles I', 'James II'],
      ),
      model: 'James I',
      points: [point('James I', { allow: ['James VI and I'], reject: ['Elizabeth I'] })],
      guidance:
        'Elizabeth I died in 1603. James, already king of Scots, was thought to descend from Banquo and had written about witchcraft.',
    }),
    short({
      seconds: 35,
      stem: 'State the term for the belief that a monarch was appointed by God and answered only to God.',
      answer: words(
        'divine right of kings',
        'the divine right of kings',
        'divine right',
        'divine right of monarchs',
        'divine right to rule',
        'the divine right of monarchs',
      ),
      model: 'divine right of kings',
      points: [point('Divine right (of kings)', { reject: ['Great Chain of Being'] })],
    }),
    shortParts({
      seconds: 70,
      stem: 'These questions are about the background to *Macbeth*.',
      parts: [
        part({
          prompt: 'State the term for the killing of a king.',
          answer: exactly(['regicide'], ['homicide', 'patricide', 'suicide', 'genocide', 'treason']),
          model: 'regicide',
          points: [point('Regicide', { reject: ['treason', 'patricide'] })],
        }),
        part({
          prompt: 'Name the plot of 1605 to kill the king and his Parliament.',
          answer: words(
            'the Gunpowder Plot',
            'Gunpowder Plot',
            'Gunpowder',
            'Gunpowder Treason',
            'Gunpowder Treason Plot',
            'Gunpowder Conspiracy',
            'Powder Treason',
            'Guy Fawkes plot',
            "Guy Fawkes' plot",
            "Guy Fawkes's plot",
          ),
          model: 'Gunpowder Plot',
          points: ['The Gunpowder Plot'],
        }),
      ],
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Explain three reasons why an audience of Shakespeare’s time would have found the murder of Duncan shocking.',
      points: [
        point('A king was thought to be chosen by God, so killing him was a sin against God', {
          allow: ['divine right'],
        }),
        point('Macbeth is Duncan’s host, kinsman and subject: Duncan is there “in double trust”', {
          allow: ['he breaks the duty of a host'],
        }),
        point('It breaks the natural order, and nature itself is disturbed afterwards', {
          allow: ['Great Chain of Being', 'fear of treason after the Gunpowder Plot of 1605'],
        }),
      ],
      model:
        'Kings were believed to be appointed by God, so killing Duncan would have seemed a crime against God. Duncan is Macbeth’s guest, his kinsman and his king, and is there “in double trust”, so the murder is also a betrayal. It overturns the natural order, which is why nature itself seems disturbed that night.',
      guidance: 'Link each reason to the beliefs of the time. “Murder is wrong” would be true of any play.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain how Shakespeare presents guilt at two different points in *Macbeth*. Use evidence for each.',
      points: [
        point('A first moment of guilt, such as Macbeth after the murder of Duncan', {
          allow: ['he cannot say “Amen”', 'the voice crying “Sleep no more”'],
        }),
        'Evidence for it, such as “Will all great Neptune’s ocean wash this blood / Clean from my hand?”',
        point('A second moment, such as Banquo’s ghost at the feast or Lady Macbeth sleepwalking', {
          reject: ['the same moment told again'],
        }),
        'Evidence for it, such as “Never shake / Thy gory locks at me” or “Out, damned spot”',
      ],
      model:
        'After the murder of Duncan, Macbeth’s guilt makes him feel that his hands can never be cleaned: “Will all great Neptune’s ocean wash this blood / Clean from my hand?” In Act 5 Lady Macbeth’s guilt appears in her sleep. She tries to wash off blood that is not there and cries “Out, damned spot”, although she had earlier said that a little water would clear them of the deed.',
      guidance: 'Blood and sleep run through both moments. Linking the two shows that you know the play as a whole.',
    }),
    recall({
      seconds: 110,
      lines: 6,
      stem: 'Explain how Banquo acts as a foil to Macbeth.',
      points: [
        point('Both hear prophecies from the Witches', { allow: ['both are brave soldiers'] }),
        point('Banquo is suspicious of the Witches, and calls them “instruments of darkness”', {
          allow: ['warns that they tell truths to betray'],
        }),
        point('Banquo does not act to bring the prophecy about, whereas Macbeth turns to murder', {
          allow: ['Banquo keeps his conscience clear; Macbeth does not'],
        }),
      ],
      model:
        'Both men hear prophecies from the Witches. Banquo distrusts them, warning that “instruments of darkness” may tell small truths in order to betray. He does nothing to make his prophecy come true, whereas Macbeth murders to fulfil his, so Banquo shows that Macbeth had a choice.',
      guidance: 'A foil is a character whose difference shows another more clearly, so every point needs both men.',
    }),
  ],
};

const macbethLanguage: TopicContent = {
  number: '3',
  title: 'Macbeth: quotations and language',
  weights: { 1: 8 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Write the missing word in each quotation from *Macbeth*.',
      parts: [
        part({
          prompt: '“Fair is foul, and foul is ______”',
          answer: exactly(['fair'], ['foul', 'fear']),
          model: 'fair',
          points: ['fair'],
        }),
        part({
          prompt: '“… look like the innocent flower, / But be the ______ under’t.”',
          answer: words('serpent'),
          model: 'serpent',
          points: [point('serpent', { reject: ['snake'] })],
        }),
        part({
          prompt: '“… only / Vaulting ______, which o’erleaps itself”',
          answer: words('ambition'),
          model: 'ambition',
          points: ['ambition'],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: r`Who says these words in *Macbeth*?

> “Come, you spirits\
> That tend on mortal thoughts, unsex me here”`,
      answer: exactly(['Lady Macbeth', 'Lady M', "Macbeth's wife"], ['Lady Macduff', 'the Witches', 'Hecate']),
      model: 'Lady Macbeth',
      points: ['Lady Macbeth'],
    }),
    short({
      seconds: 35,
      stem: 'State the term for a speech in which a character, alone on stage, speaks their thoughts aloud.',
      answer: exactly(['soliloquy', 'a soliloquy', 'soliloquies'], ['monologue', 'aside', 'dialogue', 'duologue']),
      model: 'soliloquy',
      points: [point('Soliloquy', { reject: ['monologue', 'aside'] })],
      guidance:
        'An *aside* is a short remark others on stage do not hear; a *monologue* is any long speech by one person.',
    }),
    short({
      seconds: 40,
      stem: 'Name the metre in which the noble characters in *Macbeth* usually speak: lines of five pairs of syllables, unstressed then stressed.',
      answer: exactly(
        ['iambic pentameter', 'iambic pentameters', 'blank verse', 'unrhymed iambic pentameter'],
        ['trochaic tetrameter', 'iambic tetrameter', 'trochaic pentameter', 'prose'],
      ),
      model: 'iambic pentameter',
      points: [point('Iambic pentameter', { allow: ['blank verse'], reject: ['iambic tetrameter'] })],
      guidance:
        'An iamb is unstressed then stressed; five to a line is pentameter. Without rhyme it is called blank verse.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: r`Read these lines, spoken by Macbeth in Act 5.

> “Life’s but a walking shadow, a poor player\
> That struts and frets his hour upon the stage,\
> And then is heard no more.”

How does Shakespeare use language here to show Macbeth’s state of mind?`,
      points: [
        point('Identifies metaphor: life as a shadow, or as an actor', { allow: ['extended metaphor of the theatre'] }),
        point('“Shadow” suggests that life is insubstantial or close to death', { allow: ['empty', 'dark'] }),
        point('“Struts and frets” suggests pride and worry that come to nothing', {
          allow: ['“his hour” shows how brief life is'],
        }),
        point('Macbeth feels despair, or that his life and crimes have been pointless', {
          allow: ['he has just heard of his wife’s death'],
        }),
      ],
      model:
        'Macbeth uses metaphors, calling life a “walking shadow” and a “poor player”. A shadow has no substance, so life seems empty and close to darkness. “Struts and frets” makes all his pride and anxiety look like an actor’s noise, forgotten after “his hour”. He has just heard that his wife is dead, and he is in despair: everything he has done now seems pointless.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: r`Read these lines from Act 2 of *Macbeth*.

> “Is this a dagger which I see before me,\
> The handle toward my hand?”

Explain what the lines reveal about Macbeth just before he kills Duncan.`,
      points: [
        point('The question shows doubt or confusion: he cannot trust his eyes', { allow: ['he is hallucinating'] }),
        point('“The handle toward my hand” suggests that he feels invited or tempted to use it', {
          allow: ['he feels led by fate'],
        }),
        point('It shows a mind under strain, or already filled with the thought of murder', {
          allow: ['guilt before the deed', 'his conscience troubles him'],
        }),
      ],
      model:
        'Macbeth asks a question because he cannot be sure that what he sees is real. The handle is turned “toward my hand”, so the dagger seems to invite him to take it, as if the murder were meant to be. The vision shows a mind under great strain before the crime has even been committed.',
    }),
  ],
};

const carolPlot: TopicContent = {
  number: '4',
  title: 'A Christmas Carol: plot and character',
  weights: { 1: 14 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Name each character in *A Christmas Carol*.',
      parts: [
        part({
          prompt: 'Scrooge’s dead business partner',
          answer: words('Jacob Marley', 'Marley', 'Jacob'),
          model: 'Jacob Marley',
          points: ['(Jacob) Marley'],
        }),
        part({
          prompt: 'Scrooge’s clerk',
          answer: exactly(
            ['Bob Cratchit', 'Cratchit', 'Bob', 'Robert Cratchit'],
            ['Tim Cratchit', 'Peter Cratchit', 'Tiny Tim'],
          ),
          model: 'Bob Cratchit',
          points: ['(Bob) Cratchit'],
        }),
        part({
          prompt: 'Scrooge’s nephew',
          answer: exactly(['Fred', 'Frederick'], ['Bob', 'Tim', 'Peter', 'Fezziwig']),
          model: 'Fred',
          points: ['Fred'],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'Into how many staves is *A Christmas Carol* divided?',
      answer: num(5),
      model: '5',
      points: ['5'],
      guidance:
        'Dickens called the chapters *staves*, as if the story were a piece of music: Marley, the three Spirits, and the end of it.',
    }),
    short({
      seconds: 40,
      stem: 'In *A Christmas Carol*, name the young woman who ends her engagement to Scrooge because another idol, a golden one, has displaced her.',
      answer: exactly(['Belle'], ['Fan', 'Fran', 'Martha']),
      model: 'Belle',
      points: [point('Belle', { reject: ['Fan (his sister)'] })],
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'For each of the four ghosts that visit Scrooge in *A Christmas Carol*, describe briefly what it shows him or tells him.',
      points: [
        point('Marley’s Ghost warns him that he must change, or he too will wear a chain', {
          allow: ['tells him that three Spirits will come'],
        }),
        point('The Ghost of Christmas Past shows him scenes of his youth', {
          allow: ['school, Fan, Fezziwig or Belle'],
        }),
        point('The Ghost of Christmas Present shows him how others keep Christmas now', {
          allow: ['the Cratchits', 'Fred’s party', 'Ignorance and Want'],
        }),
        point('The Ghost of Christmas Yet to Come shows him his own lonely death', {
          allow: ['his grave', 'Tiny Tim’s death'],
        }),
      ],
      model:
        'Marley’s Ghost warns Scrooge that he will wear a chain after death unless he changes. The Ghost of Christmas Past shows him scenes from his youth, such as his lonely schooldays and his parting from Belle. The Ghost of Christmas Present shows him the Cratchits’ dinner and Fred’s party. The Ghost of Christmas Yet to Come shows him a death that nobody mourns, and the grave with his own name on it.',
      guidance: 'Marley counts as one of the four. One precise scene for each ghost is enough.',
    }),
    recall({
      seconds: 170,
      lines: 9,
      stem: 'Explain how Scrooge changes between Stave 1 and Stave 5 of *A Christmas Carol*. Refer to details from the novella.',
      points: [
        point('At first he is miserly, cold or isolated', { allow: ['he cares only for money'] }),
        point(
          'Evidence, such as “a squeezing, wrenching, grasping, scraping, clutching, covetous, old sinner!” or refusing to give to charity',
          {
            allow: ['“solitary as an oyster”', '“Are there no prisons?”'],
          },
        ),
        point('By the end he is generous, joyful or part of a family', { allow: ['he asks to join Fred’s dinner'] }),
        point('Evidence, such as sending the prize turkey, raising Bob’s salary, or “I am as light as a feather”', {
          allow: ['he becomes “a second father” to Tiny Tim'],
        }),
      ],
      model:
        'In Stave 1 Scrooge is mean and cut off from others: he is “a squeezing, wrenching, grasping, scraping, clutching, covetous, old sinner!” and refuses to give to the poor. By Stave 5 he is joyful and generous. He says “I am as light as a feather”, sends a prize turkey to the Cratchits, raises Bob’s salary and becomes like a second father to Tiny Tim.',
      guidance:
        'Match the evidence: refusing the charity collectors in Stave 1 against giving to one of them in Stave 5.',
    }),
  ],
};

const carolThemes: TopicContent = {
  number: '5',
  title: 'A Christmas Carol: themes and context',
  weights: { 1: 10 },
  questions: [
    shortParts({
      seconds: 60,
      stem: 'In *A Christmas Carol*, the Ghost of Christmas Present shows Scrooge two starved children beneath its robe.',
      parts: [
        part({
          prompt: 'Name the boy.',
          answer: exactly(['Ignorance'], ['Want', 'innocence', 'Tiny Tim']),
          model: 'Ignorance',
          points: ['Ignorance'],
        }),
        part({
          prompt: 'Name the girl.',
          answer: exactly(['Want'], ['Ignorance', 'Wealth', 'Poverty']),
          model: 'Want',
          points: [point('Want', { reject: ['poverty, as the name'] })],
        }),
      ],
      guidance: 'The Ghost warns Scrooge to beware them both, “but most of all beware this boy”.',
    }),
    short({
      seconds: 35,
      stem: 'In which year was *A Christmas Carol* first published?',
      answer: num(1843),
      model: '1843',
      points: ['1843'],
    }),
    short({
      seconds: 45,
      stem: 'Scrooge asks, “And the Union workhouses? Are they still in operation?” Name the law of 1834 that made the workhouse the main form of help for the poor.',
      answer: words(
        'Poor Law Amendment Act',
        'the Poor Law Amendment Act',
        'New Poor Law',
        'the New Poor Law',
        'Poor Law',
        'the Poor Law',
        'Poor Law Act',
        'Poor Law Amendment Act 1834',
        'Poor Law of 1834',
        '1834 Poor Law',
      ),
      model: 'Poor Law Amendment Act',
      points: [point('The Poor Law (Amendment Act)', { allow: ['the New Poor Law'] })],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'In Stave 1 Scrooge says that those who would rather die than go to the workhouse “had better do it, and decrease the surplus population”. Explain how Dickens uses these words in *A Christmas Carol*.',
      points: [
        point('They show Scrooge’s lack of compassion: he sees poor people as numbers', {
          allow: ['callous', 'heartless'],
        }),
        point('They echo the ideas of Malthus, who argued that population would outgrow the supply of food', {
          allow: ['attitudes of some wealthy people at the time'],
        }),
        point('The Ghost of Christmas Present repeats them about Tiny Tim', {
          allow: ['when Scrooge asks if he will live'],
        }),
        'Scrooge is ashamed, which shows the reader what such ideas mean for a real child',
      ],
      model:
        'The words show Scrooge’s coldness, because he treats poor people as a number to be reduced. They echo Malthus, who argued that population would outgrow the food supply. In Stave 3 the Ghost of Christmas Present throws the words back at Scrooge when he asks whether Tiny Tim will live. Scrooge is ashamed, and the reader sees what the idea means when the “surplus” is a child.',
      guidance:
        'The marks follow the words through the book: who says them, where they come from, who repeats them, and what happens then.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Explain how Dickens presents the Cratchit family in order to make his readers care about the poor. Give two details from *A Christmas Carol*.',
      points: [
        point('They are shown as loving, grateful or cheerful although they have little', { allow: ['dignified'] }),
        point(
          'First detail, such as Mrs Cratchit in her “twice-turned gown” or nobody admitting that the pudding is small',
          {
            allow: ['the family enjoy a goose'],
          },
        ),
        point(
          'Second detail, such as Bob toasting Scrooge as “the Founder of the Feast” or Tiny Tim’s “God bless us every one!”',
          {
            allow: ['Bob carries Tiny Tim on his shoulder'],
          },
        ),
      ],
      model:
        'Dickens shows a poor family who are loving and grateful rather than idle. Mrs Cratchit wears a “twice-turned gown” but brightens it with ribbons, and Bob even toasts Scrooge as “the Founder of the Feast”. Readers admire them, so they share Dickens’s anger that such people should be left in need.',
    }),
  ],
};

const terms: TopicContent = {
  number: '6',
  title: 'Literary terms',
  weights: { 1: 6, 2: 12 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'State the term for each feature of poetry.',
      parts: [
        part({
          prompt: 'A sentence that runs on from one line to the next without a pause',
          answer: exactly(
            [
              'enjambment',
              'enjambement',
              'enjambed',
              'enjambed line',
              'run-on line',
              'run on line',
              'run-on lines',
              'run-on',
              'run-over line',
            ],
            ['caesura', 'end-stopped', 'end-stopping'],
          ),
          model: 'enjambment',
          points: [point('Enjambment', { allow: ['run-on line'], reject: ['caesura', 'end-stopping'] })],
        }),
        part({
          prompt: 'A pause within a line, often marked by punctuation',
          answer: exactly(
            ['caesura', 'cesura', 'caesurae', 'a caesura', 'caesural pause'],
            ['enjambment', 'enjambement', 'end-stopping'],
          ),
          model: 'caesura',
          points: [point('Caesura', { reject: ['enjambment'] })],
        }),
        part({
          prompt: 'A group of lines set apart from the others in a poem',
          answer: words('stanza', 'a stanza', 'stanzas', 'verse', 'a verse', 'verses', 'strophe'),
          model: 'stanza',
          points: [point('Stanza', { allow: ['verse'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'State the number of lines in a sonnet.',
      answer: num(14),
      model: '14',
      points: ['14'],
    }),
    short({
      seconds: 40,
      stem: 'State the term for the effect created when the audience knows something that a character on stage does not.',
      answer: words('dramatic irony'),
      model: 'dramatic irony',
      points: [point('Dramatic irony', { reject: ['irony, alone', 'sarcasm'] })],
      guidance: 'Duncan praises the “pleasant seat” of the castle in which we know he is to be murdered.',
    }),
    short({
      seconds: 40,
      stem: 'State the term for a narrative in which characters and events stand throughout for abstract ideas, so that the story carries a second, usually moral, meaning.',
      answer: exactly(
        ['allegory', 'an allegory', 'allegorical', 'allegories', 'an allegorical story'],
        ['analogy', 'alliteration', 'metaphor', 'symbolism'],
      ),
      model: 'allegory',
      points: [point('Allegory', { reject: ['metaphor', 'analogy'] })],
    }),
    recall({
      seconds: 110,
      lines: 5,
      stem: 'Explain what a dramatic monologue is. Include two features.',
      points: [
        point('A poem spoken by a character who is not the poet', { allow: ['one speaker', 'a persona'] }),
        point('The speaker addresses a listener who does not reply', { allow: ['a silent audience'] }),
        point('The speaker reveals more about their character than they intend', {
          allow: ['the reader reads between the lines'],
        }),
      ],
      model:
        'A dramatic monologue is a poem spoken by one character, who is not the poet. The speaker addresses a silent listener, and reveals more about his or her own character than intended.',
      guidance: 'Name the speaker, the listener and what the speaker gives away.',
    }),
  ],
};

export const paperOneTopics: TopicContent[] = [
  macbethPlot,
  macbethThemes,
  macbethLanguage,
  carolPlot,
  carolThemes,
  terms,
];
