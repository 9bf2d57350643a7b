import { num, part, point, recall, short, shortParts, type TopicContent, words } from './build.ts';
import { exactly } from './exact-words.ts';

const earlyMedicine: TopicContent = {
  number: '1',
  title: 'Medicine in England, c1250–1700',
  weights: { 1: 18 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Medieval ideas about disease came from the ancient world.',
      parts: [
        part({
          prompt: 'Name the Greek doctor of the fifth century BC linked with the Theory of the Four Humours.',
          answer: exactly(['Hippocrates'], ['Galen', 'Aristotle', 'Socrates']),
          model: 'Hippocrates',
          points: [point('Hippocrates', { reject: ['Galen'] })],
        }),
        part({
          prompt: 'Name the doctor in the Roman Empire who developed the Theory of Opposites.',
          answer: exactly(['Galen', 'Claudius Galen'], ['Hippocrates', 'Vesalius']),
          model: 'Galen',
          points: [point('Galen', { reject: ['Hippocrates'] })],
        }),
        part({
          prompt: 'State the term for the belief that disease was spread by bad air.',
          answer: exactly(
            ['miasma', 'miasma theory', 'the miasma theory', 'theory of miasma'],
            ['germ theory', 'spontaneous generation', 'contagion'],
          ),
          model: 'miasma',
          points: [point('Miasma', { reject: ['germ theory'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'In which year did the Black Death reach England?',
      answer: num(1348),
      model: '1348',
      points: ['1348'],
      guidance: 'It came by ship to the south coast in the summer of 1348.',
    }),
    shortParts({
      seconds: 80,
      stem: 'Name each Renaissance figure.',
      parts: [
        part({
          prompt: 'The anatomist who published *On the Fabric of the Human Body* in 1543',
          answer: exactly(['Vesalius', 'Andreas Vesalius'], ['Harvey', 'William Harvey', 'Galen', 'Paré', 'Sydenham']),
          model: 'Andreas Vesalius',
          points: [point('(Andreas) Vesalius', { reject: ['Harvey'] })],
        }),
        part({
          prompt: 'The doctor who showed that blood circulates round the body, in a book of 1628',
          answer: exactly(['Harvey', 'William Harvey'], ['Vesalius', 'Sydenham', 'Galen']),
          model: 'William Harvey',
          points: [point('(William) Harvey', { reject: ['Vesalius'] })],
        }),
        part({
          prompt:
            'The English doctor, sometimes called “the English Hippocrates”, who stressed careful observation of patients’ symptoms',
          answer: exactly(['Sydenham', 'Thomas Sydenham'], ['Harvey', 'Vesalius', 'Jenner']),
          model: 'Thomas Sydenham',
          points: ['(Thomas) Sydenham'],
        }),
      ],
    }),
    recall({
      seconds: 160,
      lines: 8,
      stem: 'Explain why Galen’s ideas went largely unchallenged in medieval England.',
      points: [
        point('The Church supported them, because they fitted its belief in a body designed by God', {
          allow: ['Galen wrote of a creator'],
        }),
        point('The Church controlled universities, libraries and the training of physicians', {
          allow: ['the books that were copied'],
        }),
        point('Few dissections were carried out, so mistakes were not found', {
          allow: ['dissection was discouraged', 'bodies were used only to illustrate Galen'],
        }),
        point(
          'Respect for ancient writers, or lack of a better explanation, meant that challenging them was discouraged',
          {
            allow: ['to challenge Galen was to challenge the Church'],
          },
        ),
      ],
      model:
        'The Church supported Galen because his idea of a body designed for a purpose fitted its teaching about God. It controlled the universities and the copying of books, so physicians were trained in Galen. Few dissections took place, so his mistakes were not noticed. Ancient writers were so respected that to challenge Galen seemed to challenge the Church as well.',
      guidance: 'Give reasons, not a description of the humours. Each sentence should say why nobody questioned him.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Describe two causes that people in 1348 gave for the Black Death, and one way they tried to prevent or treat it for each.',
      points: [
        point('God’s punishment for sin', { allow: ['a test of faith'] }),
        point('So people prayed, confessed or whipped themselves', { allow: ['pilgrimage', 'flagellants'] }),
        point('Bad air, or miasma', { allow: ['an unusual position of the planets', 'imbalance of the humours'] }),
        point('So people carried sweet-smelling herbs or lit fires, or moved away', {
          allow: ['bleeding or purging, if the humours are given as the cause'],
        }),
      ],
      model:
        'Many people thought the Black Death was God’s punishment for sin, so they prayed, went on pilgrimages or even whipped themselves to show that they were sorry. Others blamed miasma, or bad air, so they carried sweet-smelling herbs or lit fires to clean it.',
      guidance: 'Match each treatment to the belief behind it. A prayer answers a punishment; herbs answer bad air.',
    }),
    recall({
      seconds: 130,
      lines: 6,
      stem: 'Explain one similarity and one difference between reactions to the Black Death (1348) and to the Great Plague (1665).',
      points: [
        point('Similarity: in both, religion or bad air was thought to be a cause', {
          allow: ['prayer and sweet-smelling herbs were used in both'],
        }),
        'Supports the similarity with a detail from each outbreak or one detail true of both',
        point('Difference: in 1665 the authorities acted more, with orders to shut up infected houses', {
          allow: ['searchers of the dead', 'watchmen', 'public gatherings banned', 'bills of mortality'],
        }),
        point('Supports the difference by showing that this did not happen on the same scale in 1348', {
          allow: ['in 1348 there was little organised action'],
        }),
      ],
      model:
        'In both 1348 and 1665 people blamed God’s anger or bad air, and they prayed and carried sweet-smelling herbs each time. In 1665, however, the authorities did much more: infected houses were shut up and guarded by watchmen and the dead were counted. In 1348 there was little organised action to stop the disease spreading.',
      guidance: 'Name both outbreaks each time. A fact about one of them is not a comparison.',
    }),
  ],
};

const victorianMedicine: TopicContent = {
  number: '2',
  title: 'Medicine in Britain, c1700–1900',
  weights: { 1: 14 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'These questions are about vaccination.',
      parts: [
        part({
          prompt: 'Name the doctor who tested vaccination in 1796.',
          answer: exactly(
            ['Edward Jenner', 'Jenner'],
            ['Pasteur', 'Louis Pasteur', 'Koch', 'Lister', 'William Jenner'],
          ),
          model: 'Edward Jenner',
          points: ['(Edward) Jenner'],
        }),
        part({
          prompt: 'Name the disease he wished to prevent.',
          answer: exactly(['smallpox', 'small pox'], ['cowpox', 'chickenpox', 'cow pox', 'cholera']),
          model: 'smallpox',
          points: [point('Smallpox', { reject: ['cowpox'] })],
        }),
        part({
          prompt: 'Name the milder disease with which he infected his patient.',
          answer: exactly(['cowpox', 'cow pox'], ['smallpox', 'chickenpox', 'small pox']),
          model: 'cowpox',
          points: [point('Cowpox', { reject: ['smallpox'] })],
        }),
      ],
    }),
    shortParts({
      seconds: 80,
      stem: 'These questions are about surgery in the nineteenth century.',
      parts: [
        part({
          prompt: 'Name the anaesthetic whose effects James Simpson discovered in 1847.',
          answer: exactly(['chloroform'], ['ether', 'chlorine', 'nitrous oxide', 'carbolic acid', 'cocaine']),
          model: 'chloroform',
          points: [point('Chloroform', { reject: ['ether'] })],
        }),
        part({
          prompt: 'Name the substance that Joseph Lister used to prevent infection.',
          answer: exactly(
            ['carbolic acid', 'carbolic', 'phenol', 'carbolic spray'],
            ['chloroform', 'carbonic acid', 'ether', 'chlorine'],
          ),
          model: 'carbolic acid',
          points: [point('Carbolic acid', { reject: ['chloroform'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'Name the French scientist who published his germ theory in 1861.',
      answer: exactly(['Louis Pasteur', 'Pasteur'], ['Robert Koch', 'Koch', 'Lister', 'Jenner']),
      model: 'Louis Pasteur',
      points: [point('(Louis) Pasteur', { reject: ['Koch'] })],
      guidance:
        'Pasteur was French and began with decay in liquids. Koch was German and identified the bacteria behind particular diseases.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Describe how John Snow investigated cholera in London in 1854, and explain why his work mattered.',
      points: [
        point('He mapped deaths from cholera around Broad Street', { allow: ['in Soho'] }),
        point('The deaths were clustered round the Broad Street pump', {
          allow: ['people who drank elsewhere, such as brewery workers, did not fall ill'],
        }),
        point('The handle of the pump was removed, and the outbreak ended', { allow: ['deaths fell'] }),
        point('He showed a link between cholera and contaminated water, which went against miasma', {
          allow: ['it was evidence for better sewers and water'],
          reject: ['he proved the germ theory'],
        }),
      ],
      model:
        'In 1854 Snow marked deaths from cholera on a map of the streets round Broad Street and saw that they were clustered about one water pump. He had the handle of the pump removed, and the outbreak ended. His work showed that cholera was linked to dirty water, not to bad air, although many people did not accept it at the time.',
      guidance:
        'Snow worked before Pasteur’s germ theory, so he could show how cholera spread but could not say what caused it.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain how the Public Health Act of 1875 went further than that of 1848, and give one reason why.',
      points: [
        point('The 1848 Act was permissive: it allowed towns to set up boards of health but mostly did not make them', {
          allow: ['not compulsory'],
        }),
        'The 1875 Act was compulsory: councils had to act',
        point('Councils had to provide clean water or sewers', {
          allow: ['medical officers of health', 'refuse collection', 'sanitary inspectors'],
        }),
        point(
          'A reason, such as the acceptance of germ theory, working men gaining the vote in 1867, or the Great Stink of 1858',
          {
            allow: ['further cholera outbreaks', 'decline of laissez-faire'],
          },
        ),
      ],
      model:
        'The 1848 Act only allowed towns to set up local boards of health, so many did nothing. The 1875 Act was compulsory: councils had to provide clean water and proper sewers. One reason was that Pasteur’s germ theory of 1861 had helped to explain how dirty water spread disease; another was that many working men could vote after 1867.',
      guidance: 'The key words are *permissive* for 1848 and *compulsory* for 1875.',
    }),
  ],
};

const modernMedicine: TopicContent = {
  number: '3',
  title: 'Medicine in Britain since 1900',
  weights: { 1: 14 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'These questions are about penicillin.',
      parts: [
        part({
          prompt: 'Name the scientist who noticed its effect on bacteria in 1928.',
          answer: words('Alexander Fleming', 'Fleming', 'Sir Alexander Fleming'),
          model: 'Alexander Fleming',
          points: [point('(Alexander) Fleming', { reject: ['Florey', 'Chain'] })],
        }),
        part({
          prompt: 'Name one of the two scientists who led the Oxford team that developed it around 1940.',
          answer: words(
            'Howard Florey',
            'Florey',
            'Ernst Chain',
            'Chain',
            'Ernst Boris Chain',
            'Florey and Chain',
            'Howard Florey and Ernst Chain',
            'Chain and Florey',
          ),
          model: 'Howard Florey',
          points: [point('(Howard) Florey or (Ernst) Chain', { reject: ['Fleming'] })],
        }),
        part({
          prompt: 'State the term for a medicine, such as penicillin, that kills or stops the growth of bacteria.',
          answer: exactly(
            ['antibiotic', 'an antibiotic', 'antibiotics', 'antibacterial'],
            ['antiseptic', 'antibody', 'antibodies', 'vaccine', 'antiseptics'],
          ),
          model: 'antibiotic',
          points: [point('Antibiotic', { allow: ['antibacterial'], reject: ['antiseptic', 'vaccine'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'In which year was the National Health Service launched?',
      answer: num(1948),
      model: '1948',
      points: ['1948'],
    }),
    short({
      seconds: 40,
      stem: 'Watson and Crick published the structure of DNA in 1953. Name its shape.',
      answer: exactly(
        [
          'double helix',
          'a double helix',
          'double-helix',
          'the double helix',
          'double spiral',
          'a double spiral',
          'twisted ladder',
        ],
        ['single helix'],
      ),
      model: 'double helix',
      points: [
        point('Double helix', { allow: ['double spiral', 'twisted ladder'], reject: ['spiral or helix, alone'] }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'Salvarsan 606, developed in Paul Ehrlich’s laboratory, was the first “magic bullet”. Name the disease it treated.',
      answer: words('syphilis'),
      model: 'syphilis',
      points: ['Syphilis'],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain why penicillin could be mass-produced by 1944.',
      points: [
        point('Florey and Chain’s team found how to purify it and tested it on patients', {
          allow: ['the trial in 1941'],
        }),
        point('The war created an urgent need, because wounds became infected', { allow: ['to treat soldiers'] }),
        point('The United States government gave money to drug companies to make it', {
          allow: ['funding after the USA entered the war'],
        }),
        point('Industry found ways of growing it in large quantities', {
          allow: ['fermentation in large tanks', 'technology'],
        }),
      ],
      model:
        'Florey, Chain and their team purified penicillin and showed that it worked on patients. The Second World War created an urgent need for it to treat infected wounds, so the American government paid for its development. Drug companies then found ways of growing it in huge tanks, so that there was enough for Allied troops by D-Day in 1944.',
      guidance:
        'Sort the reasons: scientists, war, government, industry. Fleming’s discovery of 1928 does not explain why it happened by 1944.',
    }),
    recall({
      seconds: 110,
      lines: 5,
      stem: 'Describe three actions that governments in the United Kingdom have taken to reduce deaths from smoking.',
      points: [
        point('Banned or restricted advertising of cigarettes', { allow: ['on television from 1965'] }),
        point('Banned smoking in enclosed public places and workplaces', { allow: ['in England in 2007'] }),
        point('Raised taxes, raised the age of sale to 18, or ran health campaigns', {
          allow: ['plain packaging', 'warnings on packets', 'ban on displays in shops'],
        }),
      ],
      model:
        'Governments banned the advertising of cigarettes, beginning with television in 1965. Smoking in enclosed public places and workplaces was banned, in England in 2007. They also raised taxes on tobacco and the age at which it can be bought.',
    }),
  ],
};

const coldWarOrigins: TopicContent = {
  number: '4',
  title: 'Origins of the Cold War, 1945–1956',
  weights: { 1: 14 },
  questions: [
    shortParts({
      seconds: 70,
      stem: 'Name the place where each wartime conference was held.',
      parts: [
        part({
          prompt: 'The conference of Stalin, Roosevelt and Churchill in February 1945',
          answer: exactly(['Yalta', 'Yalta Conference', 'Crimea'], ['Potsdam', 'Tehran', 'Malta']),
          model: 'Yalta',
          points: [point('Yalta', { allow: ['Crimea'], reject: ['Potsdam', 'Tehran'] })],
        }),
        part({
          prompt: 'The conference of July and August 1945, attended by Truman',
          answer: exactly(['Potsdam', 'Potsdam Conference'], ['Yalta', 'Tehran']),
          model: 'Potsdam',
          points: [point('Potsdam', { allow: ['Potsdam, near Berlin'], reject: ['Yalta', 'Berlin, alone'] })],
        }),
      ],
      guidance: 'Roosevelt died in April 1945, so a conference with Truman is the later one.',
    }),
    short({
      seconds: 40,
      stem: 'In a speech in March 1946, who said that an “iron curtain” had descended across Europe?',
      answer: words('Winston Churchill', 'Churchill', 'Sir Winston Churchill'),
      model: 'Winston Churchill',
      points: [point('(Winston) Churchill', { reject: ['Truman', 'Attlee'] })],
    }),
    shortParts({
      seconds: 70,
      stem: 'State the year in which each alliance was formed.',
      parts: [
        part({
          prompt: 'NATO',
          answer: num(1949),
          model: '1949',
          points: ['1949'],
        }),
        part({
          prompt: 'The Warsaw Pact',
          answer: num(1955),
          model: '1955',
          points: ['1955'],
        }),
      ],
      guidance: 'The Warsaw Pact followed West Germany’s admission to NATO in 1955.',
    }),
    short({
      seconds: 40,
      stem: 'Name the operation by which Western countries supplied West Berlin during the Soviet blockade of 1948–49.',
      answer: words(
        'Berlin Airlift',
        'the Berlin Airlift',
        'Airlift',
        'Berlin air lift',
        'the airlift',
        'Operation Vittles',
        'Operation Plainfare',
      ),
      model: 'the Berlin Airlift',
      points: ['The (Berlin) Airlift'],
    }),
    recall({
      seconds: 160,
      lines: 8,
      stem: 'Explain the difference between the Truman Doctrine and the Marshall Plan, and why Stalin objected to the Marshall Plan.',
      points: [
        point('Truman Doctrine (1947): the USA would support countries threatened by communism', {
          allow: ['containment'],
        }),
        point('It was applied first to Greece and Turkey', { allow: ['military and economic aid'] }),
        point('Marshall Plan: economic aid to help Europe recover from the war', {
          allow: ['from 1948', 'poverty made communism attractive'],
        }),
        point(
          'Stalin saw it as an attempt to gain influence over Europe, and stopped Eastern European countries from taking part',
          {
            allow: ['dollar imperialism', 'he set up Cominform or Comecon in reply'],
          },
        ),
      ],
      model:
        'The Truman Doctrine of 1947 was a political promise that the USA would support countries threatened by communism, beginning with Greece and Turkey. The Marshall Plan gave economic aid so that European countries could rebuild and would not turn to communism. Stalin saw this as a way for the USA to buy influence in Europe, so he would not let the countries of Eastern Europe accept it.',
      guidance:
        'The Doctrine was a political promise; the Plan was money. Make that contrast before you turn to Stalin.',
    }),
    recall({
      seconds: 130,
      lines: 6,
      stem: 'Describe three consequences of the Hungarian Uprising of 1956.',
      points: [
        point('Soviet troops and tanks crushed it, and thousands of Hungarians were killed', {
          allow: ['about 200,000 people fled'],
        }),
        point('Nagy was removed and later executed, and Kádár became leader', { allow: ['Nagy was executed in 1958'] }),
        point('The West did not send help, so the limits of containment were clear', {
          allow: ['Soviet control of Eastern Europe was confirmed', 'Western protests grew'],
        }),
      ],
      model:
        'Soviet tanks crushed the rising in November 1956, and thousands of Hungarians were killed while about 200,000 fled. Nagy was replaced by Kádár and was executed in 1958. The West protested but sent no military help, which showed that it would not fight for countries already under Soviet control.',
      guidance: 'Consequences come after November 1956. Do not tell the story of why the rising began.',
    }),
  ],
};

const coldWarCrises: TopicContent = {
  number: '5',
  title: 'Cold War crises, 1957–1970',
  weights: { 1: 12 },
  questions: [
    short({
      seconds: 35,
      stem: 'In which year was the Berlin Wall built?',
      answer: num(1961),
      model: '1961',
      points: ['1961'],
    }),
    shortParts({
      seconds: 80,
      stem: 'These questions are about Cuba.',
      parts: [
        part({
          prompt: 'Name the leader of Cuba after the revolution of 1959.',
          answer: words('Fidel Castro', 'Castro', 'Fidel'),
          model: 'Fidel Castro',
          points: [point('(Fidel) Castro', { reject: ['Batista'] })],
        }),
        part({
          prompt: 'Name the bay where an invasion by Cuban exiles, backed by the USA, failed in April 1961.',
          answer: words('Bay of Pigs', 'the Bay of Pigs', 'Pigs', 'Pigs Bay', 'Bahía de Cochinos', 'Playa Girón'),
          model: 'Bay of Pigs',
          points: ['The Bay of Pigs'],
        }),
        part({
          prompt: 'Name the Soviet leader during the missile crisis of October 1962.',
          answer: exactly(
            ['Nikita Khrushchev', 'Khrushchev', 'Kruschev', 'Khruschev', 'Krushchev', 'Krushev', 'Kruschov', 'Nikita'],
            ['Stalin', 'Brezhnev', 'Gorbachev'],
          ),
          model: 'Nikita Khrushchev',
          points: [
            point('(Nikita) Khrushchev', { allow: ['other spellings that are clear'], reject: ['Stalin', 'Brezhnev'] }),
          ],
        }),
      ],
    }),
    shortParts({
      seconds: 70,
      stem: 'These questions are about Czechoslovakia in 1968.',
      parts: [
        part({
          prompt: 'Name the leader whose reforms became known as the Prague Spring.',
          answer: words('Alexander Dubček', 'Alexander Dubcek', 'Dubček', 'Dubcek'),
          model: 'Alexander Dubček',
          points: [point('(Alexander) Dubček', { reject: ['Brezhnev', 'Husák'] })],
        }),
        part({
          prompt:
            'Name the doctrine, announced afterwards, under which the Soviet Union claimed the right to act where communism was threatened.',
          answer: words('Brezhnev Doctrine', 'the Brezhnev Doctrine', 'Brezhnev'),
          model: 'the Brezhnev Doctrine',
          points: [point('The Brezhnev Doctrine', { reject: ['the Truman Doctrine'] })],
        }),
      ],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain why the Berlin Wall was built.',
      points: [
        point('Large numbers of East Germans were leaving for the West through Berlin', {
          allow: ['more than two million since 1949'],
        }),
        point('Many were young, skilled or educated, so the East German economy suffered', {
          allow: ['a brain drain'],
        }),
        point('It was embarrassing for the communists that people preferred the West', { allow: ['bad propaganda'] }),
        point('Talks and Khrushchev’s ultimatum had failed to make the West leave Berlin', {
          allow: ['summits at Paris and Vienna failed'],
        }),
      ],
      model:
        'Large numbers of East Germans were escaping to the West through Berlin. Many were skilled and educated, so East Germany was losing the workers it needed. It was also humiliating for a communist government that its people preferred capitalism. Khrushchev’s ultimatum and the summit meetings had failed to remove the West from Berlin, so in August 1961 the border was closed.',
      guidance:
        'Explain means link cause and result. “People were leaving” needs “so East Germany lost its skilled workers”.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Describe four results of the Cuban Missile Crisis of 1962.',
      points: [
        'The Soviet Union removed its missiles from Cuba',
        point('The USA promised not to invade Cuba', { allow: ['Cuba stayed communist'] }),
        point('The USA agreed in secret to remove its missiles from Turkey', { allow: ['Jupiter missiles'] }),
        point('Relations improved: the hotline between Washington and Moscow, or the Test Ban Treaty, in 1963', {
          allow: ['later arms-control treaties'],
        }),
      ],
      model:
        'The Soviet Union took its missiles out of Cuba, and the USA promised not to invade the island. In secret the USA also agreed to remove its missiles from Turkey. In 1963 a hotline was set up between Washington and Moscow, and the Limited Test Ban Treaty was signed.',
      guidance:
        'The removal of missiles from Turkey was secret, so at the time it looked as if only the Soviet Union had given way.',
    }),
  ],
};

const coldWarEnd: TopicContent = {
  number: '6',
  title: 'The end of the Cold War, 1970–1991',
  weights: { 1: 12 },
  questions: [
    shortParts({
      seconds: 70,
      stem: 'These questions are about the 1970s.',
      parts: [
        part({
          prompt: 'State the French term used for the easing of tension between the superpowers.',
          answer: exactly(['détente', 'detente'], ['entente', 'deterrent', 'defence']),
          model: 'détente',
          points: [point('Détente', { reject: ['entente'] })],
        }),
        part({
          prompt: 'State the year in which SALT 1 was signed.',
          answer: num(1972),
          model: '1972',
          points: ['1972'],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'Which country did the Soviet Union invade in December 1979?',
      answer: words('Afghanistan'),
      model: 'Afghanistan',
      points: ['Afghanistan'],
    }),
    shortParts({
      seconds: 80,
      stem: 'Gorbachev became leader of the Soviet Union in 1985. Give the Russian name for each of his policies.',
      parts: [
        part({
          prompt: 'Openness, with less censorship',
          answer: exactly(['glasnost'], ['perestroika']),
          model: 'glasnost',
          points: [point('Glasnost', { reject: ['perestroika'] })],
        }),
        part({
          prompt: 'Restructuring of the economy and the political system',
          answer: exactly(['perestroika', 'perestroyka'], ['glasnost']),
          model: 'perestroika',
          points: [point('Perestroika', { reject: ['glasnost'] })],
        }),
      ],
    }),
    short({
      seconds: 35,
      stem: 'On 9 November of which year were the crossings of the Berlin Wall opened?',
      answer: num(1989),
      model: '1989',
      points: ['1989'],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Describe four ways in which the USA, under President Carter, responded to the Soviet invasion of Afghanistan.',
      points: [
        point('It boycotted the Moscow Olympics of 1980', { reject: ['the Soviet boycott of 1984'] }),
        point('It stopped sales of grain to the Soviet Union', { allow: ['economic sanctions'] }),
        point('SALT 2 was not ratified', { allow: ['Carter withdrew SALT 2 from the Senate'] }),
        point('The Carter Doctrine promised to protect the Persian Gulf by force if necessary', {
          allow: ['aid to the Afghan resistance', 'increased defence spending'],
        }),
      ],
      model:
        'Carter led a boycott of the 1980 Moscow Olympics and stopped sales of grain to the Soviet Union. He asked the Senate to put off SALT 2, which was never ratified. In the Carter Doctrine he warned that the USA would use force if necessary to protect the Persian Gulf.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain how events in Eastern Europe led to the opening of the Berlin Wall.',
      points: [
        point('Gorbachev made clear that Soviet troops would not be used to support communist governments', {
          allow: ['he gave up the Brezhnev Doctrine'],
        }),
        point('In Poland Solidarity won elections, which encouraged change elsewhere', {
          allow: ['June 1989', 'the first non-communist-led government in Eastern Europe since the 1940s'],
        }),
        point('Hungary opened its border with Austria, so East Germans could leave for the West', {
          allow: ['in 1989'],
        }),
        point('Huge protests took place in East Germany, and its government announced that people could travel', {
          allow: ['in Leipzig and East Berlin', '9 November 1989'],
        }),
      ],
      model:
        'Gorbachev gave up the Brezhnev Doctrine, so communist governments could no longer rely on Soviet troops. In Poland Solidarity won the elections of June 1989, and Hungary opened its border with Austria, so that thousands of East Germans could leave. After huge protests in East Germany its government announced that people could travel, and on 9 November 1989 crowds passed through the Wall.',
      guidance: 'Put the events in order and say how each one led to the next.',
    }),
  ],
};

export const paperOneTopics: TopicContent[] = [
  earlyMedicine,
  victorianMedicine,
  modernMedicine,
  coldWarOrigins,
  coldWarCrises,
  coldWarEnd,
];
