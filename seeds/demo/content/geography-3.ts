import { num, part, point, r, recall, short, shortParts, type TopicContent, words } from './build.ts';

/** Paper 2: resources and population; and skills, which both papers test. */
export const geographyTopics8To10: TopicContent[] = [
  {
    number: '8',
    title: 'Resource management',
    weights: { 2: 16 },
    questions: [
      short({
        seconds: 75,
        guidance: 'Write the millions out in full before you divide, or keep both numbers in thousands.',
        stem: 'A reservoir supplies the town of Lythbury with 27 million litres of water each day. The town has 180,000 people. Calculate the mean supply per person per day.',
        lines: 2,
        answerLabel: 'Mean supply =',
        answer: num(150, { unit: 'litres' }),
        recompute: () => 27e6 / 180000,
        model: '150',
        points: [r`$\dfrac{27\,000\,000}{180\,000}$`, '150 (litres)'],
      }),
      short({
        seconds: 45,
        stem: 'State the term for the distance food travels from where it is produced to where it is eaten.',
        answer: words('food miles', 'food mile', 'food mileage'),
        model: 'food miles',
        points: [point('food miles', { reject: ['carbon footprint'] })],
      }),
      short({
        seconds: 45,
        stem: 'State the term for the total amount of greenhouse gases released by the activities of a person, product or organisation.',
        answer: words('carbon footprint'),
        model: 'carbon footprint',
        points: [point('carbon footprint', { reject: ['food miles', 'ecological footprint'] })],
      }),
      shortParts({
        seconds: 80,
        stem: 'Is each source of energy **renewable** or **non-renewable**?',
        parts: [
          part({
            prompt: 'Geothermal energy',
            answer: words('renewable', 'it is renewable'),
            model: 'renewable',
            points: ['renewable'],
          }),
          part({
            prompt: 'Natural gas',
            answer: words('non-renewable', 'non renewable', 'nonrenewable', 'it is non-renewable', 'not renewable'),
            model: 'non-renewable',
            points: ['non-renewable'],
          }),
          part({
            prompt: 'Nuclear power that uses uranium',
            answer: words('non-renewable', 'non renewable', 'nonrenewable', 'it is non-renewable', 'not renewable'),
            model: 'non-renewable',
            points: ['non-renewable'],
          }),
        ],
        guidance:
          'Nuclear power releases little carbon dioxide as it runs, but uranium is mined and will run out, so it is non-renewable.',
      }),
      short({
        seconds: 70,
        stem: `One country generated 320 TWh of electricity in a year. Of this:

- wind supplied 58 TWh
- solar supplied 14 TWh
- hydroelectric supplied 24 TWh

The rest came from non-renewable sources. Calculate the percentage that came from renewable sources.`,
        lines: 3,
        answerLabel: 'Percentage =',
        answer: num(30, { unit: '%' }),
        recompute: () => ((58 + 14 + 24) / 320) * 100,
        model: '30',
        points: [r`$\dfrac{96}{320} \times 100$, or total of $96$ seen`, '30 (%)'],
      }),
      recall({
        seconds: 120,
        stem: 'Explain three reasons why the world’s demand for water is rising.',
        lines: 6,
        points: [
          point('The population is growing, so more water is used for drinking and in homes'),
          point('More food is needed, so more water is used to irrigate crops', {
            allow: ['more meat is eaten, which needs more water'],
          }),
          point('Industry is growing, or people are richer, so more water is used', {
            allow: ['cooling power stations', 'more showers and washing machines', 'tourism'],
          }),
        ],
        model:
          'The population is growing, so more water is needed in homes. More food must be grown, so more water is used for irrigation. As countries develop, factories and power stations use more, and people can afford appliances such as washing machines.',
        guidance: 'Three separate reasons are wanted. Population growth told in three ways is one reason.',
      }),
      recall({
        seconds: 140,
        stem: 'Give two advantages and two disadvantages of building a large dam and reservoir to supply water to a dry region.',
        lines: 7,
        points: [
          point('One advantage, for example a reliable water supply all year', {
            allow: ['irrigation increases food production', 'hydroelectric power', 'flood control', 'jobs or tourism'],
          }),
          point('A second, different advantage'),
          point('One disadvantage, for example people lose their homes or land', {
            allow: [
              'habitats are flooded',
              'high cost',
              'less water or sediment downstream',
              'water lost by evaporation',
              'conflict with other users',
            ],
          }),
          point('A second, different disadvantage'),
        ],
        model:
          'Advantages: the reservoir gives a reliable supply all year, and water can be used to irrigate crops. Disadvantages: people must move from land that is flooded, and less water and sediment reach places downstream.',
      }),
      recall({
        seconds: 150,
        guidance: 'Name a method, then say how it gives more food. "Better farming" is too vague to be credited.',
        stem: 'Explain two ways in which the supply of food can be increased.',
        lines: 8,
        points: [
          point('One method described, for example irrigation', {
            allow: [
              'hydroponics or aeroponics',
              'high-yield seeds',
              'biotechnology or genetic modification',
              'fertiliser',
              'mechanisation',
            ],
          }),
          point('How it increases supply, for example crops grow in dry areas or dry seasons'),
          point('A second method described, for example genetically modified crops'),
          point('How it increases supply, for example the crop resists pests, so less is lost'),
        ],
        model:
          'Irrigation brings water to dry land, so crops can be grown in the dry season and there can be more than one harvest a year. Genetically modified crops can resist pests or drought, so less of the harvest is lost.',
      }),
    ],
  },
  {
    number: '9',
    title: 'Population and migration',
    weights: { 2: 12 },
    questions: [
      shortParts({
        seconds: 80,
        stem: 'A country has a birth rate of 31 per 1,000 people per year and a death rate of 9 per 1,000 people per year.',
        parts: [
          part({
            prompt: 'Calculate the natural increase per 1,000 people per year.',
            answer: num(22, { unit: 'per 1,000' }),
            answerLabel: 'Natural increase =',
            recompute: () => 31 - 9,
            model: '22',
            points: ['22 (per 1,000)'],
          }),
          part({
            prompt: 'Give the natural increase as a percentage per year.',
            answer: num(2.2, { unit: '%' }),
            answerLabel: 'Natural increase =',
            recompute: () => ((31 - 9) / 1000) * 100,
            model: '2.2',
            points: ['2.2 (%)'],
          }),
        ],
        guidance: 'Rates are per thousand, so divide by 10 to change to a percentage.',
      }),
      shortParts({
        seconds: 75,
        stem: 'Give the number of the stage of the demographic transition model that fits each country. Use the model with five stages.',
        parts: [
          part({
            prompt: 'The birth rate is high and the death rate is falling rapidly.',
            answer: words('2', 'stage 2', 'two', 'stage two', 'second', '2nd', 'second stage', '2nd stage', 'II'),
            answerLabel: 'Stage',
            model: '2',
            points: ['Stage 2'],
          }),
          part({
            prompt: 'The birth rate has fallen below a low death rate, so the population decreases naturally.',
            answer: words('5', 'stage 5', 'five', 'stage five', 'fifth', '5th', 'fifth stage', '5th stage', 'V'),
            answerLabel: 'Stage',
            model: '5',
            points: ['Stage 5'],
          }),
        ],
      }),
      short({
        seconds: 85,
        stem: r`The population of a country is made up of:

- 5.2 million people aged under 15
- 12.0 million people aged 15 to 64
- 2.0 million people aged 65 and over

Calculate the dependency ratio. Use

$$
\text{dependency ratio} = \frac{\text{people under 15} + \text{people 65 and over}}{\text{people aged 15 to 64}} \times 100
$$`,
        lines: 3,
        answerLabel: 'Dependency ratio =',
        answer: num(60),
        recompute: () => ((5.2 + 2.0) / 12.0) * 100,
        model: '60',
        points: [r`$\dfrac{5.2 + 2.0}{12.0} \times 100$`, '60'],
        guidance: 'A ratio of 60 means 60 dependants for every 100 people of working age.',
      }),
      short({
        seconds: 45,
        stem: 'Name the type of graph that shows the numbers of males and females in each age group of a population.',
        answer: words(
          'population pyramid',
          'age-sex pyramid',
          'age sex pyramid',
          'population pyramids',
          'age pyramid',
          'age-gender pyramid',
          'population structure pyramid',
          'pyramid',
        ),
        model: 'population pyramid',
        points: [point('population pyramid', { allow: ['age–sex pyramid'], ignore: ['bar chart'] })],
      }),
      short({
        seconds: 45,
        stem: 'State the term for a person who has been forced to leave their own country because of war or persecution.',
        answer: words('refugee', 'refugees'),
        model: 'refugee',
        points: [point('refugee', { reject: ['asylum seeker', 'economic migrant', 'internally displaced person'] })],
      }),
      short({
        seconds: 50,
        stem: 'In one year 412,000 people move into a country and 287,000 people move out. Calculate the net migration into the country.',
        answerLabel: 'Net migration =',
        answer: num(125000, { unit: 'people' }),
        recompute: () => 412000 - 287000,
        model: '125000',
        points: ['125,000 (people)'],
      }),
      recall({
        seconds: 150,
        stem: 'Explain why birth rates usually fall as a country develops.',
        lines: 8,
        points: [
          point('Family planning is more widely available and understood', { allow: ['contraception'] }),
          point('More women are educated and have careers, so they marry or have children later'),
          point('Fewer infants die, so parents do not need as many births for some children to survive', {
            allow: ['better health care for children'],
          }),
          point('Children are no longer needed to work on the land, or cost more to bring up', {
            allow: ['pensions mean parents rely less on children in old age'],
          }),
        ],
        model:
          'Contraception becomes more widely available. More women are educated and have careers, so they have children later. Health care improves and fewer infants die, so parents choose to have fewer. Fewer families farm the land, so children are not needed to work and are expensive to raise.',
      }),
      recall({
        seconds: 140,
        guidance: 'State the change first, then its effect on government, services or employers.',
        stem: 'Explain two problems that an ageing population can cause for a country.',
        lines: 7,
        points: [
          point('One problem, for example more demand for health care and care homes', {
            allow: ['higher cost of pensions', 'shortage of workers', 'closure of schools'],
          }),
          point('Why it is a problem, for example older people use health services more, so government spending rises'),
          point('A second problem, for example fewer people of working age'),
          point('Why it is a problem, for example less is collected in income tax, or jobs cannot be filled'),
        ],
        model:
          'Older people use health services more, so hospitals and care homes cost the government more. There are fewer people of working age, so some jobs cannot be filled and less income tax is collected.',
      }),
      recall({
        seconds: 140,
        stem: 'Give two benefits and two problems for a country from which many young workers emigrate.',
        lines: 7,
        points: [
          point('One benefit, for example migrants send money home', {
            allow: [
              'remittances',
              'less unemployment',
              'less pressure on housing or services',
              'migrants may return with new skills',
            ],
          }),
          point('A second, different benefit'),
          point('One problem, for example a shortage of skilled workers', {
            allow: ['brain drain', 'ageing population left behind', 'families are divided', 'less tax is collected'],
          }),
          point('A second, different problem', { reject: ['problems in the country migrants move to'] }),
        ],
        model:
          'Benefits: migrants send money home to their families, and there is less competition for jobs. Problems: the country loses skilled workers such as doctors, and an older population is left behind.',
        guidance: 'Keep to the country of origin. Effects on the country that receives the migrants earn nothing.',
      }),
    ],
  },
  {
    number: '10',
    title: 'Fieldwork and geographical skills',
    weights: { 1: 8, 2: 16 },
    questions: [
      shortParts({
        seconds: 110,
        stem: 'The long axes of nine pebbles, in millimetres, are: 34, 28, 41, 22, 37, 30, 45, 26, 33.',
        guidance: 'Put the values in order before you look for the middle one.',
        parts: [
          part({
            prompt: 'Find the median.',
            lines: 2,
            answer: num(33, { unit: 'mm' }),
            answerLabel: 'Median =',
            recompute: () => [34, 28, 41, 22, 37, 30, 45, 26, 33].sort((a, b) => a - b)[4] ?? Number.NaN,
            model: '33',
            points: ['33 (mm)'],
          }),
          part({
            prompt: 'Calculate the range.',
            answer: num(23, { unit: 'mm' }),
            answerLabel: 'Range =',
            recompute: () => 45 - 22,
            model: '23',
            points: ['23 (mm)'],
          }),
        ],
      }),
      short({
        seconds: 100,
        stem: 'The numbers of pedestrians counted at eleven sites, in order, are: 4, 6, 7, 9, 10, 12, 13, 15, 18, 20, 23. The lower quartile is the value in position (n + 1) ÷ 4 and the upper quartile is the value in position 3(n + 1) ÷ 4. Calculate the interquartile range.',
        lines: 3,
        answerLabel: 'Interquartile range =',
        answer: num(11),
        recompute: () => {
          const counts = [4, 6, 7, 9, 10, 12, 13, 15, 18, 20, 23];
          const at = (position: number) => counts[position - 1] ?? Number.NaN;
          return at((3 * (11 + 1)) / 4) - at((11 + 1) / 4);
        },
        model: '11',
        points: ['Lower quartile 7 and upper quartile 18', '11'],
        guidance: 'With 11 values the quartiles are the 3rd and the 9th. The interquartile range is their difference.',
      }),
      short({
        seconds: 65,
        stem: 'On a map with a scale of 1 : 50,000 the straight-line distance between two churches is 6.4 cm. Calculate the real distance in kilometres.',
        lines: 2,
        answerLabel: 'Distance =',
        answer: num(3.2, { unit: 'km' }),
        recompute: () => (6.4 * 50000) / 100000,
        model: '3.2',
        points: [
          r`$6.4 \times 50\,000 = 320\,000\ \text{cm}$, or $1\ \text{cm}$ represents $0.5\ \text{km}$`,
          '3.2 (km)',
        ],
        guidance: 'There are 100,000 cm in a kilometre, so on this scale 2 cm on the map is 1 km on the ground.',
      }),
      shortParts({
        seconds: 85,
        stem: 'Name the sampling method used in each fieldwork study.',
        parts: [
          part({
            prompt: 'A questionnaire is delivered to every tenth house along each road.',
            answer: words(
              'systematic',
              'systematic sampling',
              'systematic sample',
              'systematically',
              'interval sampling',
            ),
            model: 'systematic',
            points: ['systematic'],
          }),
          part({
            prompt: 'Houses to visit are chosen by numbering every house and using a random number generator.',
            answer: words(
              'random',
              'random sampling',
              'simple random',
              'simple random sampling',
              'random sample',
              'randomly',
            ),
            model: 'random',
            points: ['random'],
          }),
          part({
            prompt: 'People are interviewed so that each age group is in the same proportion as in the whole town.',
            answer: words(
              'stratified',
              'stratified sampling',
              'stratified sample',
              'quota',
              'quota sampling',
              'proportional stratified sampling',
              'stratified random sampling',
            ),
            model: 'stratified',
            points: [point('stratified', { allow: ['quota'] })],
          }),
        ],
      }),
      short({
        seconds: 110,
        stem: 'A float is timed over 10 m of a river. The three times are 12.0 s, 13.0 s and 12.5 s. Calculate the mean time, then use it to find the mean surface velocity of the river.',
        lines: 4,
        answerLabel: 'Velocity =',
        answer: num(0.8, { unit: 'm/s' }),
        recompute: () => 10 / ((12.0 + 13.0 + 12.5) / 3),
        model: '0.80',
        points: ['Mean time of 12.5 (s)', '10 ÷ 12.5', '0.80 (m/s)'],
        guidance: 'Velocity is distance divided by time. Dividing 12.5 by 10 gives 1.25, which is the usual slip.',
      }),
      shortParts({
        seconds: 75,
        stem: 'A student counts pedestrians at sites at different distances from the centre of a town and plots each site as a point on a graph. The number of pedestrians falls as distance from the centre rises.',
        parts: [
          part({
            prompt: 'Name the type of graph.',
            answer: words(
              'scatter graph',
              'scattergraph',
              'scatter-graph',
              'scatter plot',
              'scattergram',
              'scatter diagram',
              'scatter chart',
              'scatter',
            ),
            model: 'scatter graph',
            points: [point('scatter graph', { reject: ['line graph'] })],
          }),
          part({
            prompt: 'Name the type of correlation shown.',
            answer: words(
              'negative',
              'negative correlation',
              'negatively',
              'inverse',
              'inverse correlation',
              'indirect',
            ),
            model: 'negative',
            points: ['negative'],
          }),
        ],
      }),
      shortParts({
        seconds: 60,
        guidance:
          'Primary data are collected first-hand for the study. Anything collected by someone else is secondary.',
        stem: 'Is each set of data **primary** or **secondary** for a student who uses it in a study of a river?',
        parts: [
          part({
            prompt: 'River depths that the student measured on a field trip',
            answer: words('primary', 'primary data', 'it is primary'),
            model: 'primary',
            points: ['primary'],
          }),
          part({
            prompt: 'River flow records downloaded from a government website',
            answer: words('secondary', 'secondary data', 'it is secondary'),
            model: 'secondary',
            points: ['secondary'],
          }),
        ],
      }),
      recall({
        seconds: 140,
        stem: 'Students are going to measure the depth and width of a shallow river. Identify two risks and explain how each can be reduced.',
        lines: 7,
        points: [
          point('One risk, for example slipping on wet rocks', {
            allow: ['being swept away', 'cold or wet weather', 'infection from dirty water', 'traffic near the site'],
          }),
          point('How that risk is reduced, for example wearing boots with good grip'),
          point('A second risk, for example being swept away by deep or fast water'),
          point(
            'How that risk is reduced, for example checking the forecast and river level first and not entering water above the knee',
            {
              allow: ['any sensible measure that fits the risk'],
            },
          ),
        ],
        model:
          'Students could slip on wet rocks, so they should wear boots with good grip and move slowly. They could be swept away if the water is deep, so the teacher should check the river level beforehand and no one should go in above the knee.',
        guidance: '"Be careful" is not a way of reducing a risk. Say what is done, worn or checked.',
      }),
      recall({
        seconds: 140,
        stem: 'To find how busy a town centre is, a student counts pedestrians at one place for five minutes on a Tuesday morning. Suggest two improvements to this method and explain how each would make the results more reliable.',
        lines: 7,
        points: [
          point('One improvement, for example count at several places', {
            allow: [
              'count at other times or days',
              'count for longer',
              'repeat and take a mean',
              'two people count the same flow',
            ],
          }),
          point('Why, for example one place may not be typical of the whole centre'),
          point('A second improvement, for example count at different times and on different days'),
          point('Why, for example numbers vary between mornings and afternoons, weekdays and weekends', {
            allow: ['a reason that fits the improvement given'],
          }),
        ],
        model:
          'The student could count at several places, because one street may not be typical of the whole town centre. The counts could be repeated at different times and on a Saturday as well, because the number of shoppers changes through the day and the week.',
      }),
    ],
  },
];
