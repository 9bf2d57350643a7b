import { num, part, point, r, recall, short, shortParts, type TopicContent, words } from './build.ts';

/** Probability and statistics. */
export const dataTopics: TopicContent[] = [
  {
    number: '11',
    title: 'Probability',
    weights: { 2: 20 },
    questions: [
      short({
        seconds: 35,
        stem: r`A biased coin is thrown $250$ times. It lands on heads $155$ times.

Work out the relative frequency of heads.`,
        answer: num(0.62),
        model: '0.62',
        recompute: () => 155 / 250,
        points: [point(r`$0.62$, or equivalent`, { code: 'B', allow: ['31/50', '62%'] })],
      }),
      short({
        seconds: 65,
        stem: r`The probability that a bus is late on any day is $0.15$. The bus runs on $180$ days.

Work out the number of days on which the bus is expected to be late.`,
        lines: 2,
        answerLabel: 'Number of days =',
        answer: num(27),
        model: '27',
        recompute: () => 0.15 * 180,
        points: [point(r`$0.15 \times 180$`, { code: 'M' }), point(r`$27$`, { code: 'A', reject: ['27/180'] })],
      }),
      short({
        seconds: 100,
        stem: r`A spinner can land on $1$, $2$, $3$ or $4$. The probabilities are

$$
\begin{array}{c|cccc}
\text{Number} & 1 & 2 & 3 & 4 \\ \hline
\text{Probability} & 0.2 & 0.35 & x & 2x
\end{array}
$$

Work out the probability that the spinner lands on $4$.`,
        lines: 3,
        answer: num(0.3),
        model: '0.3',
        recompute: () => (2 * (1 - 0.2 - 0.35)) / (1 + 2),
        points: [
          point(r`$1 - 0.2 - 0.35 = 0.45$, or an equation with all four probabilities adding up to $1$`, { code: 'M' }),
          point(r`$0.45 \div 3 = 0.15$`, { code: 'M' }),
          point(r`$0.3$, or equivalent`, { code: 'A', reject: ['0.15 as the final answer'] }),
        ],
      }),
      short({
        seconds: 110,
        stem: r`The probability that it rains on Saturday is $0.3$. The probability that it rains on Sunday is $0.4$. The two events are independent.

Work out the probability that it rains on at least one of the two days.`,
        lines: 4,
        answer: num(0.58),
        model: '0.58',
        recompute: () => 1 - (1 - 0.3) * (1 - 0.4),
        points: [
          point(r`$0.7$ or $0.6$ seen as a probability of no rain`, {
            code: 'B',
            allow: ['0.3 × 0.4 = 0.12 seen'],
          }),
          point(r`$1 - 0.7 \times 0.6$, or $0.3 \times 0.4 + 0.3 \times 0.6 + 0.7 \times 0.4$`, {
            code: 'M',
            allow: ['0.3 + 0.4 − 0.3 × 0.4'],
          }),
          point(r`$0.58$, or equivalent`, { code: 'A', reject: ['0.7, from adding the two probabilities'] }),
        ],
        guidance: 'At least one is everything except none. Take the probability of no rain on both days from 1.',
      }),
      short({
        seconds: 120,
        stem: r`A bag contains $5$ red counters and $3$ blue counters. Two counters are taken at random from the bag without replacement.

Work out the probability that the two counters are the same colour.`,
        lines: 5,
        answer: num(13 / 28, { range: { min: 0.46, max: 0.4645 } }),
        model: '13/28',
        recompute: () => (5 / 8) * (4 / 7) + (3 / 8) * (2 / 7),
        points: [
          point(r`$\frac{5}{8} \times \frac{4}{7}$ or $\frac{3}{8} \times \frac{2}{7}$`, { code: 'M' }),
          point(r`Adds both products: $\frac{20}{56} + \frac{6}{56}$`, { code: 'M' }),
          point(r`$\frac{13}{28}$, or equivalent`, {
            code: 'A',
            allow: ['26/56', '0.46 or better'],
            reject: ['34/64, from replacing the first counter'],
          }),
        ],
        guidance: r`The first counter is not put back, so there are $7$ left for the second, and one fewer of the colour taken.`,
      }),
      short({
        seconds: 110,
        stem: r`In a group of $40$ students, $22$ study French, $17$ study Spanish and $9$ study neither. One of the students is chosen at random.

Work out the probability that the student studies both French and Spanish.`,
        lines: 4,
        answer: num(0.2),
        model: '0.2',
        recompute: () => (22 + 17 - (40 - 9)) / 40,
        points: [
          point(r`$40 - 9 = 31$ study at least one`, { code: 'M' }),
          point(r`$22 + 17 - 31 = 8$ study both`, { code: 'M', allow: ['8 in the overlap of a Venn diagram'] }),
          point(r`$\frac{8}{40}$, or equivalent`, { code: 'A', allow: ['1/5', '0.2', '20%'] }),
        ],
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Of $80$ people in a club, $48$ own a bicycle, $30$ own a scooter and $12$ own both. One person is chosen at random from those who own a scooter.

Work out the probability that this person also owns a bicycle.`,
        lines: 2,
        answer: num(0.4),
        model: '0.4',
        recompute: () => 12 / 30,
        points: [
          point(r`Uses $30$ as the denominator`, { code: 'M' }),
          point(r`$\frac{12}{30}$, or equivalent`, {
            code: 'A',
            allow: ['2/5', '0.4', '40%'],
            reject: ['12/80', '12/48'],
          }),
        ],
        guidance:
          'The condition cuts the group down to the scooter owners, so the total is theirs and not the whole club.',
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`A code is made of two different letters chosen from A, B, C, D and E, followed by two digits from $0$ to $9$. The digits may be the same. The order of the letters and of the digits matters.

Work out how many different codes can be made.`,
        lines: 3,
        answerLabel: 'Number of codes =',
        answer: num(2000),
        model: '2000',
        recompute: () => 5 * (5 - 1) * 10 * 10,
        points: [
          point(r`$5 \times 4$ or $10 \times 10$ seen`, { code: 'M' }),
          point(r`$2000$`, {
            code: 'A',
            reject: ['2500, from letting the letters repeat', '1800, from not letting the digits repeat'],
          }),
        ],
      }),
      short({
        seconds: 160,
        tier: 'higher',
        stem: r`A bag contains $n$ counters. $6$ of the counters are red. Two counters are taken at random without replacement. The probability that both are red is $\frac{1}{3}$.

Work out the value of $n$.`,
        lines: 6,
        answerLabel: 'n =',
        answer: num(10),
        model: '10',
        // n² − n − 6 × 5 × 3 = 0
        recompute: () => (1 + Math.sqrt(1 + 4 * 6 * 5 * 3)) / 2,
        points: [
          point(r`$\dfrac{6}{n} \times \dfrac{5}{n - 1}$`, { code: 'M' }),
          point(r`$n^2 - n - 90 = 0$, or $n(n - 1) = 90$`, { code: 'A' }),
          point(r`Factorises: $(n - 10)(n + 9)$, or another complete method`, { code: 'M', allow: ['10 × 9 = 90'] }),
          point(r`$n = 10$`, { code: 'A', reject: ['−9 as a final answer'] }),
        ],
      }),
      recall({
        seconds: 130,
        stem: r`$A$ and $B$ are two events. State what it means for $A$ and $B$ to be mutually exclusive and what it means for them to be independent. For each, give the rule for combining their probabilities.`,
        lines: 6,
        points: [
          point('Mutually exclusive events cannot happen at the same time', { code: 'B' }),
          point(r`If they are mutually exclusive, the probability of $A$ or $B$ is $\text{P}(A) + \text{P}(B)$`, {
            code: 'B',
          }),
          point('Independent events: whether one happens does not change the probability of the other', {
            code: 'B',
            allow: ['One has no effect on the other'],
            ignore: ['They are separate events'],
          }),
          point(r`If they are independent, the probability of $A$ and $B$ is $\text{P}(A) \times \text{P}(B)$`, {
            code: 'B',
          }),
        ],
        model: r`Mutually exclusive events cannot both happen at the same time, and then the probability of $A$ or $B$ is $\text{P}(A) + \text{P}(B)$. Events are independent if one happening does not change the probability of the other, and then the probability of $A$ and $B$ is $\text{P}(A) \times \text{P}(B)$.`,
      }),
    ],
  },
  {
    number: '12',
    title: 'Statistics',
    weights: { 3: 20 },
    questions: [
      short({
        seconds: 30,
        stem: 'A scatter graph shows the ages of some cars and their values. As age increases, value decreases. Name the type of correlation that the graph shows.',
        answer: words(
          'negative',
          'negative correlation',
          'negatively correlated',
          'a negative correlation',
          'strong negative',
          'strong negative correlation',
          'weak negative',
          'weak negative correlation',
          'inverse',
          'inverse correlation',
          '-ve',
          '-ve correlation',
        ),
        model: 'Negative',
        points: [
          point('Negative', {
            code: 'B',
            allow: ['Inverse'],
            ignore: ['Strong, weak'],
            reject: ['Decreasing', 'Downward'],
          }),
        ],
      }),
      shortParts({
        seconds: 75,
        stem: r`Here are the times, in minutes, that six students took to walk to school.

$$
12 \qquad 7 \qquad 15 \qquad 9 \qquad 21 \qquad 10
$$`,
        parts: [
          part({
            prompt: 'Work out the range.',
            answerLabel: 'Range =',
            answer: num(14, { unit: 'minutes' }),
            model: '14',
            recompute: () => Math.max(12, 7, 15, 9, 21, 10) - Math.min(12, 7, 15, 9, 21, 10),
            points: [point(r`$14$`, { code: 'B', reject: ['7 to 21'] })],
          }),
          part({
            prompt: 'Work out the median.',
            lines: 2,
            answerLabel: 'Median =',
            answer: num(11, { unit: 'minutes' }),
            model: '11',
            recompute: () => {
              const sorted = [12, 7, 15, 9, 21, 10].sort((a, b) => a - b);
              return ((sorted[2] ?? 0) + (sorted[3] ?? 0)) / 2;
            },
            points: [
              point('Writes the times in order, with at most one slip', { code: 'M', allow: ['10 and 12 identified'] }),
              point(r`$11$`, { code: 'A', reject: ['12, from the unordered list'] }),
            ],
          }),
        ],
      }),
      short({
        seconds: 100,
        stem: r`The mean of $8$ numbers is $14.5$. One of the numbers is removed. The mean of the other $7$ numbers is $13$.

Work out the number that was removed.`,
        lines: 3,
        answer: num(25),
        model: '25',
        recompute: () => 8 * 14.5 - 7 * 13,
        points: [
          point(r`$8 \times 14.5 = 116$ or $7 \times 13 = 91$`, { code: 'M' }),
          point(r`Subtracts the two totals: $116 - 91$`, { code: 'M' }),
          point(r`$25$`, { code: 'A' }),
        ],
        guidance: 'Means cannot be subtracted. Turn each one into a total first.',
      }),
      short({
        seconds: 100,
        stem: r`A group of $12$ boys and $18$ girls sat a test. The mean mark of the boys was $61$. The mean mark of the girls was $66$.

Work out the mean mark of all $30$ students.`,
        lines: 3,
        answerLabel: 'Mean =',
        answer: num(64),
        model: '64',
        recompute: () => (12 * 61 + 18 * 66) / 30,
        points: [
          point(r`$12 \times 61 = 732$ or $18 \times 66 = 1188$`, { code: 'M' }),
          point(r`$\dfrac{732 + 1188}{30}$`, { code: 'M' }),
          point(r`$64$`, { code: 'A', reject: ['63.5, the mean of the two means'] }),
        ],
      }),
      short({
        seconds: 120,
        stem: r`The table shows the times, $t$ minutes, that $20$ customers waited in a queue.

$$
\begin{array}{c|c}
\text{Time} & \text{Frequency} \\ \hline
0 < t \leq 10 & 4 \\
10 < t \leq 20 & 9 \\
20 < t \leq 30 & 5 \\
30 < t \leq 40 & 2
\end{array}
$$

Work out an estimate for the mean waiting time.`,
        lines: 4,
        answerLabel: 'Mean =',
        answer: num(17.5, { unit: 'minutes' }),
        model: '17.5',
        recompute: () => (4 * 5 + 9 * 15 + 5 * 25 + 2 * 35) / (4 + 9 + 5 + 2),
        points: [
          point(
            r`Uses the midpoints $5$, $15$, $25$ and $35$ in products with the frequencies, at least three correct`,
            { code: 'M' },
          ),
          point(r`Divides the sum of their products by $20$: $\frac{350}{20}$`, {
            code: 'M',
            reject: ['Dividing by 4'],
          }),
          point(r`$17.5$`, { code: 'A' }),
        ],
        guidance: 'Divide by the number of customers, which is the total frequency, and not by the number of rows.',
      }),
      short({
        seconds: 65,
        stem: r`A pie chart shows how $90$ students travel to school. The angle of the sector for students who walk is $136^\circ$.

Work out the number of students who walk.`,
        lines: 2,
        answerLabel: 'Number of students =',
        answer: num(34),
        model: '34',
        recompute: () => (136 / 360) * 90,
        points: [
          point(r`$\frac{136}{360} \times 90$`, { code: 'M', allow: ['4° for each student'] }),
          point(r`$34$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 80,
        tier: 'higher',
        stem: r`Here are the numbers of goals scored by $11$ players in a season, written in order.

$$
3 \quad 5 \quad 6 \quad 8 \quad 9 \quad 11 \quad 12 \quad 14 \quad 15 \quad 19 \quad 22
$$

Work out the interquartile range.`,
        lines: 3,
        answerLabel: 'Interquartile range =',
        answer: num(9),
        model: '9',
        recompute: () => {
          const goals = [3, 5, 6, 8, 9, 11, 12, 14, 15, 19, 22];
          return (goals[(3 * (11 + 1)) / 4 - 1] ?? 0) - (goals[(11 + 1) / 4 - 1] ?? 0);
        },
        points: [
          point(r`Lower quartile $6$ or upper quartile $15$`, {
            code: 'M',
            allow: ['The 3rd or 9th value identified'],
          }),
          point(r`$9$`, { code: 'A', reject: ['6 to 15', '19, the range'] }),
        ],
      }),
      shortParts({
        seconds: 110,
        tier: 'higher',
        stem: r`A histogram shows the masses, $w$ kg, of some parcels.`,
        parts: [
          part({
            prompt: r`There are $48$ parcels in the class $20 < w \leq 35$. Work out the frequency density of this class.`,
            lines: 2,
            answerLabel: 'Frequency density =',
            answer: num(3.2),
            model: '3.2',
            recompute: () => 48 / (35 - 20),
            points: [point(r`$48 \div 15$`, { code: 'M' }), point(r`$3.2$`, { code: 'A' })],
          }),
          part({
            prompt: r`The frequency density of the class $35 < w \leq 40$ is $5.4$. Work out the number of parcels in this class.`,
            lines: 2,
            answerLabel: 'Number of parcels =',
            answer: num(27),
            model: '27',
            recompute: () => 5.4 * (40 - 35),
            points: [point(r`$27$`, { code: 'B' })],
          }),
        ],
        guidance:
          'In a histogram the area of a bar shows the frequency. Frequency density is frequency divided by class width.',
      }),
      recall({
        seconds: 100,
        tier: 'higher',
        stem: r`Two classes sat the same test. Class A has a median mark of $34$ and an interquartile range of $9$. Class B has a median mark of $29$ and an interquartile range of $15$.

Compare the marks of the two classes.`,
        lines: 4,
        points: [
          point('The median of class A is higher, so class A did better on average', {
            code: 'B',
            allow: ['The same statement about class B'],
            reject: ['The two medians stated with no comparison'],
          }),
          point('The interquartile range of class A is smaller, so the marks of class A are more consistent', {
            code: 'B',
            allow: ['Less spread out, less varied'],
            reject: ['The range is smaller'],
          }),
        ],
        model: r`Class A has the higher median, $34$ against $29$, so on average class A did better. Class A has the smaller interquartile range, $9$ against $15$, so its marks were more consistent.`,
        guidance: 'Compare one average and one measure of spread, and say what each means for the marks in the test.',
      }),
      recall({
        seconds: 90,
        stem: 'Explain why the mean worked out from a grouped frequency table is only an estimate. Give one reason for using the median rather than the mean when a set of data has a very large outlier.',
        lines: 4,
        points: [
          point('The exact values in each group are not known, so the midpoints are used in their place', {
            code: 'B',
            allow: ['The exact data values are not known', 'The midpoint may not be the mean of its group'],
          }),
          point('The median is hardly affected by the outlier, whereas the mean is pulled up by it', {
            code: 'B',
            allow: ['The mean is distorted by the outlier'],
            reject: ['The median is easier to work out'],
          }),
        ],
        model:
          'The exact values in each group are not known, so every value is taken to be the midpoint of its group. The median is hardly affected by one very large value, whereas the mean is pulled up by it and no longer represents most of the data.',
      }),
      recall({
        seconds: 65,
        stem: 'Explain why it may be unreliable to use a line of best fit to estimate a value beyond the range of the data.',
        lines: 3,
        points: [
          point('The trend may not continue outside the range of the data, so this is extrapolation', {
            code: 'B',
            allow: ['There is no evidence that the same relationship holds there'],
            ignore: ['The line is only an estimate'],
          }),
        ],
        model:
          'It is extrapolation: there are no data there, so there is no evidence that the trend continues outside the range.',
      }),
    ],
  },
];
