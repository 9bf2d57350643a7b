import { num, part, point, r, recall, short, shortParts, type TopicContent, words } from './build.ts';

/** Coasts for Paper 1; cities and development for Paper 2. */
export const geographyTopics5To7: TopicContent[] = [
  {
    number: '5',
    title: 'Coastal landscapes',
    weights: { 1: 14 },
    questions: [
      shortParts({
        seconds: 110,
        stem: 'Waves erode a crack in a headland. Name the landform at each stage.',
        parts: [
          part({
            prompt: 'The crack is widened into a hollow in the cliff.',
            answer: words('cave', 'caves', 'sea cave'),
            model: 'cave',
            points: [point('cave', { reject: ['wave-cut notch'] })],
          }),
          part({
            prompt: 'The hollow is eroded right through the headland.',
            answer: words('arch', 'arches', 'sea arch', 'natural arch', 'archway'),
            model: 'arch',
            points: ['arch'],
          }),
          part({
            prompt: 'The roof falls in and leaves a pillar of rock.',
            answer: words('stack', 'stacks', 'sea stack'),
            model: 'stack',
            points: ['stack'],
          }),
          part({
            prompt: 'The pillar is undercut and collapses, leaving a low rock that is covered at high tide.',
            answer: words('stump', 'stumps', 'sea stump'),
            model: 'stump',
            points: ['stump'],
          }),
        ],
        guidance: 'The order is crack, cave, arch, stack, stump.',
      }),
      recall({
        seconds: 160,
        stem: 'Explain how longshore drift moves sediment along a beach.',
        lines: 8,
        points: [
          point('Waves approach the beach at an angle, in the direction of the prevailing wind'),
          point('Swash carries sediment up the beach at this angle'),
          point('Backwash carries sediment straight back down the beach under gravity', {
            allow: ['at right angles to the shore'],
          }),
          point('The process repeats, so sediment moves along the beach in a zigzag'),
        ],
        model:
          'The prevailing wind makes waves approach the beach at an angle. Swash carries sediment up the beach at the same angle. Backwash carries it straight back down the slope under gravity. This is repeated, so sediment moves along the beach in a zigzag.',
        guidance: 'Use the words swash and backwash, and give the direction of each.',
      }),
      short({
        seconds: 40,
        stem: 'Name the type of wave that has a strong swash and a weak backwash, and builds up beaches.',
        answer: words('constructive', 'constructive wave', 'constructive waves'),
        model: 'constructive',
        points: [point('constructive', { reject: ['destructive'] })],
      }),
      short({
        seconds: 70,
        stem: 'A house at Penmarrow stands 49 m from the edge of a cliff. The cliff retreats at a mean rate of 1.4 m per year. Calculate how many years it will take for the edge to reach the house if the rate does not change.',
        lines: 2,
        answerLabel: 'Time =',
        answer: num(35, { unit: 'years' }),
        recompute: () => 49 / 1.4,
        model: '35',
        points: [r`$\dfrac{49}{1.4}$`, '35 (years)'],
      }),
      shortParts({
        seconds: 120,
        stem: 'A sea wall 600 m long is planned for Penmarrow at a cost of £5,400 per metre. It would protect property worth £8.1 million.',
        parts: [
          part({
            prompt: 'Calculate the cost of the wall in millions of pounds.',
            lines: 2,
            answer: num(3.24),
            answerLabel: 'Cost in £ million =',
            recompute: () => (600 * 5400) / 1e6,
            model: '3.24',
            points: ['600 × 5,400', '3.24'],
          }),
          part({
            prompt: 'Calculate the ratio of the value protected to the cost. Give your answer in the form n : 1.',
            answer: num(2.5, { unit: ': 1' }),
            answerLabel: 'Ratio =',
            recompute: () => 8.1e6 / (600 * 5400),
            model: '2.5 : 1',
            points: ['2.5 (: 1)'],
          }),
        ],
        guidance:
          'Where the value protected is greater than the cost, n is more than 1 and the scheme is easier to justify.',
      }),
      short({
        seconds: 45,
        stem: 'Name the type of soft engineering in which sand or shingle is added to a beach to make it wider or higher.',
        answer: words(
          'beach nourishment',
          'nourishment',
          'beach replenishment',
          'beach recharge',
          'beach feeding',
          'sand nourishment',
          'beach renourishment',
          'beach nourishing',
          'replenishment',
          'sand replenishment',
          'beach replenishing',
          'shingle recharge',
        ),
        model: 'beach nourishment',
        points: [
          point('beach nourishment', { allow: ['beach replenishment'], reject: ['beach reprofiling', 'groynes'] }),
        ],
      }),
      short({
        seconds: 45,
        stem: 'Water in a crack in a cliff turns to ice and expands. This happens again and again until pieces of rock break off. Name this process.',
        answer: words(
          'freeze-thaw',
          'freeze–thaw',
          'freeze thaw',
          'freeze-thaw weathering',
          'freeze–thaw weathering',
          'freeze thaw weathering',
          'freeze and thaw',
          'frost shattering',
          'frost action',
          'frost weathering',
          'frost wedging',
          'ice wedging',
        ),
        model: 'freeze-thaw',
        points: [
          point('freeze–thaw', { allow: ['frost shattering'], reject: ['mechanical or physical weathering, alone'] }),
        ],
      }),
      recall({
        seconds: 130,
        stem: 'Explain how headlands and bays form on a coast of hard and soft rock.',
        lines: 6,
        points: [
          point('Bands of harder and softer rock meet the coast at right angles', {
            allow: ['a discordant coastline'],
          }),
          point('The softer rock is eroded more quickly, forming bays'),
          point('The harder rock erodes more slowly and is left sticking out as headlands', {
            reject: ['the hard rock is not eroded at all'],
          }),
        ],
        model:
          'Bands of hard and soft rock lie at right angles to the coast. Waves erode the softer rock more quickly, which forms bays. The harder rock is more resistant, so it erodes more slowly and is left as headlands.',
      }),
      recall({
        seconds: 140,
        guidance: 'A sea wall reflects or absorbs the energy of the waves. It does not stop the waves arriving.',
        stem: 'Give two advantages and two disadvantages of protecting a seaside town with a sea wall.',
        lines: 7,
        points: [
          point('One advantage, for example it stops waves eroding the land behind it', {
            allow: [
              'protects homes, roads and jobs',
              'prevents flooding',
              'lasts for many years',
              'provides a promenade',
            ],
          }),
          point('A second, different advantage'),
          point('One disadvantage, for example it is expensive to build and maintain', {
            allow: ['unattractive', 'restricts access to the beach', 'reflected waves scour the beach'],
          }),
          point('A second, different disadvantage', { ignore: ['the reverse of an advantage already given'] }),
        ],
        model:
          'Advantages: it protects homes and roads from erosion and flooding, and the top can be used as a promenade. Disadvantages: it costs a great deal to build and maintain, and it can look unattractive.',
      }),
    ],
  },
  {
    number: '6',
    title: 'Urban issues and challenges',
    weights: { 2: 22 },
    questions: [
      short({
        seconds: 40,
        stem: 'State the term for an increase in the proportion of people living in towns and cities.',
        answer: words('urbanisation', 'urbanization'),
        model: 'urbanisation',
        points: [point('urbanisation', { reject: ['urban sprawl', 'industrialisation', 'migration'] })],
      }),
      short({
        seconds: 75,
        stem: 'The city of Orvanda had 2.4 million people in 2005 and 4.2 million in 2020. Calculate the percentage increase in its population.',
        lines: 2,
        answerLabel: 'Percentage increase =',
        answer: num(75, { unit: '%' }),
        recompute: () => ((4.2 - 2.4) / 2.4) * 100,
        model: '75',
        points: [r`$\dfrac{4.2 - 2.4}{2.4} \times 100$`, '75 (%)'],
        guidance: 'Divide the increase by the population at the start, not at the end.',
      }),
      recall({
        seconds: 130,
        stem: 'Give two push factors and two pull factors that cause people in low-income countries to move from the countryside to cities.',
        lines: 6,
        points: [
          point('One push factor, for example drought or crop failure', {
            allow: [
              'few jobs',
              'low pay',
              'poor schools or health care',
              'natural disaster',
              'farm machinery replaces workers',
              'conflict',
            ],
          }),
          point('A second, different push factor', { ignore: ['the reverse of a pull factor already given'] }),
          point('One pull factor, for example more jobs', {
            allow: ['better pay', 'better schools or health care', 'family already living there', 'more entertainment'],
          }),
          point('A second, different pull factor', { ignore: ['the reverse of a push factor already given'] }),
        ],
        model:
          'Push factors: drought makes crops fail, and farm machinery leaves fewer jobs for workers. Pull factors: cities have more hospitals, and relatives already living there can help new arrivals.',
        guidance:
          'A pull factor that only turns round a push factor, such as few jobs and more jobs, is not credited twice.',
      }),
      short({
        seconds: 40,
        stem: 'State the term for a city with more than 10 million inhabitants.',
        answer: words('megacity', 'mega city', 'mega-city', 'megacities'),
        model: 'megacity',
        points: [point('megacity', { reject: ['world city', 'capital city', 'conurbation'] })],
      }),
      short({
        seconds: 70,
        stem: 'The city of Belwick has 840,000 people living in an area of 350 km². Calculate its population density.',
        lines: 2,
        answerLabel: 'Population density =',
        answer: num(2400, { unit: 'people per km²' }),
        recompute: () => 840000 / 350,
        model: '2400',
        points: [r`$\dfrac{840\,000}{350}$`, '2,400 (people per km²)'],
      }),
      shortParts({
        seconds: 70,
        stem: 'Name the type of land used in each development.',
        parts: [
          part({
            prompt: 'Flats are built where a disused factory stood in the inner city.',
            answer: words('brownfield', 'brownfield site', 'brownfield land', 'brown field', 'brown field site'),
            model: 'brownfield',
            points: ['brownfield'],
          }),
          part({
            prompt: 'Houses are built on farmland at the edge of the city that has never been built on.',
            answer: words('greenfield', 'greenfield site', 'greenfield land', 'green field', 'green field site'),
            model: 'greenfield',
            points: [point('greenfield', { reject: ['green belt'] })],
          }),
        ],
        guidance:
          'Greenfield describes land never built on. Green belt is a planning area round a city in which building is restricted.',
      }),
      short({
        seconds: 70,
        guidance: 'A full circle is 360°, so each one per cent is 3.6°.',
        stem: 'A survey finds that 35% of journeys to work in Belwick are by bus. Calculate the angle of the sector for bus journeys on a pie chart.',
        lines: 2,
        answerLabel: 'Angle =',
        answer: num(126, { unit: '°' }),
        recompute: () => 0.35 * 360,
        model: '126',
        points: [r`$\dfrac{35}{100} \times 360$`, '126 (°)'],
      }),
      recall({
        seconds: 150,
        stem: 'Explain two problems faced by people who live in squatter settlements in fast-growing cities.',
        lines: 8,
        points: [
          point('One problem described, for example no clean water supply or sewers', {
            allow: [
              'overcrowding',
              'no legal right to the land',
              'steep or flood-prone land',
              'homes of weak materials',
              'few formal jobs',
            ],
          }),
          point('How it affects people, for example diseases such as cholera spread'),
          point('A second problem described, for example homes are built on steep or low-lying land'),
          point('How it affects people, for example homes are destroyed by landslides or floods', {
            allow: ['an effect that follows from the problem given'],
          }),
        ],
        model:
          'Many homes have no clean water or sewers, so diseases such as cholera spread easily. Many are built on steep slopes because flatter land is taken, so heavy rain can cause landslides that destroy them.',
        guidance: 'Two problems named with no effect explained earn half the marks.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain two ways in which a city can reduce traffic congestion.',
        lines: 8,
        points: [
          point('One method described, for example bus lanes or trams', {
            allow: ['park and ride', 'congestion charge', 'cycle lanes', 'car sharing', 'underground railway'],
          }),
          point('How it works, for example journeys by public transport become quicker, so fewer people drive'),
          point('A second method described, for example a charge for driving into the centre'),
          point('How it works, for example drivers pay more, so some travel another way or at another time'),
        ],
        model:
          'Bus lanes let buses pass queues of cars, so bus journeys are quicker and fewer people drive. A charge for driving into the city centre makes driving more expensive, so some people travel by train instead.',
      }),
    ],
  },
  {
    number: '7',
    title: 'Development and the economic world',
    weights: { 2: 22 },
    questions: [
      shortParts({
        seconds: 100,
        stem: 'Name the sector of employment to which each job belongs.',
        parts: [
          part({
            prompt: 'Coal miner',
            answer: words('primary', 'primary sector', 'primary industry'),
            model: 'primary',
            points: ['primary'],
          }),
          part({
            prompt: 'Worker in a car assembly plant',
            answer: words('secondary', 'secondary sector', 'secondary industry', 'manufacturing'),
            model: 'secondary',
            points: [point('secondary', { allow: ['manufacturing'] })],
          }),
          part({
            prompt: 'Nurse in a hospital',
            answer: words('tertiary', 'tertiary sector', 'tertiary industry', 'service', 'services', 'service sector'),
            model: 'tertiary',
            points: [point('tertiary', { allow: ['services'] })],
          }),
          part({
            prompt: 'Scientist in a research laboratory',
            answer: words('quaternary', 'quaternary sector', 'quaternary industry'),
            model: 'quaternary',
            points: ['quaternary'],
          }),
        ],
        guidance:
          'Primary extracts raw materials, secondary makes goods, tertiary provides services and quaternary deals in knowledge and research.',
      }),
      short({
        seconds: 75,
        stem: 'The gross national income of the country of Sorrenya is 54,000 million US dollars in one year. Its population is 12 million. Calculate the gross national income per head.',
        lines: 2,
        answerLabel: 'GNI per head =',
        answer: num(4500, { unit: 'US dollars' }),
        recompute: () => (54000 * 1e6) / (12 * 1e6),
        model: '4500',
        points: [r`$\dfrac{54\,000}{12}$`, '4,500 (US dollars)'],
      }),
      short({
        seconds: 50,
        stem: 'Name the measure of development that gives the number of children who die before the age of one, per 1,000 live births in a year.',
        answer: words(
          'infant mortality rate',
          'infant mortality',
          'IMR',
          'rate of infant mortality',
          'infant death rate',
        ),
        model: 'infant mortality rate',
        points: [point('infant mortality rate', { reject: ['death rate', 'child mortality rate'] })],
      }),
      recall({
        seconds: 90,
        stem: 'State the three aspects of development that are combined in the Human Development Index (HDI).',
        lines: 4,
        points: [
          point('Life expectancy', { allow: ['health, measured by life expectancy'] }),
          point('Education', { allow: ['mean or expected years of schooling', 'literacy rate'] }),
          point('Income', { allow: ['gross national income per head', 'GDP per head', 'standard of living'] }),
        ],
        model:
          'The HDI combines life expectancy, education (years of schooling) and income (gross national income per head).',
        guidance: 'A measure that combines social and economic data gives a fuller picture than income alone.',
      }),
      short({
        seconds: 60,
        guidance: 'A country has a trade deficit when it imports more than it exports.',
        stem: 'In one year Sorrenya exports goods worth £18.6 billion and imports goods worth £23.1 billion. Calculate its trade deficit.',
        answerLabel: 'Trade deficit in £ billion =',
        answer: num(4.5),
        recompute: () => 23.1 - 18.6,
        model: '4.5',
        points: ['(£)4.5 (billion)'],
      }),
      short({
        seconds: 45,
        stem: 'State the term for a large company that operates in more than one country.',
        answer: words(
          'transnational corporation',
          'transnational company',
          'transnational',
          'trans-national corporation',
          'TNC',
          'multinational corporation',
          'multinational company',
          'multinational',
          'multi-national company',
          'multi-national corporation',
          'multi-national',
          'MNC',
          'MNCs',
          'MNE',
          'transnationals',
          'multinationals',
          'multinational enterprise',
          'multinational business',
          'transnational business',
          'TNCs',
          'transnational corporations',
          'multinational corporations',
          'transnational corporation (TNC)',
        ),
        model: 'transnational corporation',
        points: [point('transnational corporation', { allow: ['TNC', 'multinational company'] })],
      }),
      recall({
        seconds: 140,
        stem: 'Give two advantages and two disadvantages to a lower-income country of a transnational corporation opening a factory there.',
        lines: 7,
        points: [
          point('One advantage, for example it provides jobs', {
            allow: [
              'workers learn skills',
              'taxes are paid to the government',
              'roads or ports are improved',
              'local suppliers gain business',
            ],
          }),
          point('A second, different advantage'),
          point('One disadvantage, for example much of the profit goes abroad', {
            allow: ['low pay', 'poor working conditions', 'pollution', 'the company may move to a cheaper country'],
          }),
          point('A second, different disadvantage'),
        ],
        model:
          'Advantages: the factory provides jobs, and its taxes can pay for schools and hospitals. Disadvantages: much of the profit goes to the company’s home country, and the factory may pollute local rivers.',
      }),
      recall({
        seconds: 110,
        stem: 'Explain how microfinance loans can help to reduce the development gap.',
        lines: 6,
        points: [
          point('Small loans are given to people who cannot borrow from ordinary banks', {
            allow: ['at a low rate of interest'],
          }),
          point('The money is used to start or improve a small business', { allow: ['buy a tool, animal or seed'] }),
          point('Income rises, so families can pay for food, health care or education', {
            allow: ['the loan is paid back and lent to others', 'more tax is paid'],
          }),
        ],
        model:
          'Microfinance gives small loans to people who cannot borrow from ordinary banks. They use the money to start a small business, such as buying a sewing machine. Their income rises, so they can pay for schooling and health care.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain one physical cause and one historical cause of uneven development.',
        lines: 8,
        points: [
          point('A physical cause, for example having no coast', {
            allow: ['extreme climate', 'frequent natural hazards', 'few natural resources', 'poor soils'],
          }),
          point('How it slows development, for example trade is slower and more expensive without a port'),
          point('A historical cause, for example colonial rule', { allow: ['conflict', 'slavery'] }),
          point('How it slowed development, for example raw materials and profits were taken by the ruling country', {
            allow: ['money was spent on war and not on services', 'farms and factories were destroyed'],
          }),
        ],
        model:
          'A landlocked country has no port, so importing and exporting goods is slower and costs more. In a country that was a colony, raw materials and profits were taken by the ruling country, so little was invested in local industry or schools.',
        guidance: 'The command word is explain: each cause needs a reason that leads to slower development.',
      }),
    ],
  },
];
