import { num, part, point, r, recall, short, shortParts, type TopicContent } from './build.ts';

/** Ratio, proportion and rates of change. */
export const ratioTopics: TopicContent[] = [
  {
    number: '7',
    title: 'Ratio, proportion and rates of change',
    weights: { 2: 22, 3: 10 },
    questions: [
      short({
        seconds: 70,
        stem: r`£450 is shared in the ratio $2 : 3 : 4$.

Work out the largest share.`,
        lines: 2,
        answerLabel: 'Largest share = £',
        answer: num(200),
        model: '200',
        recompute: () => (450 / (2 + 3 + 4)) * 4,
        points: [point(r`$450 \div 9$, or $50$ seen`, { code: 'M' }), point(r`$200$`, { code: 'A' })],
      }),
      short({
        seconds: 100,
        stem: r`Ana and Ben share some beads in the ratio $7 : 4$. Ana gets $36$ more beads than Ben.

Work out the total number of beads.`,
        lines: 3,
        answerLabel: 'Total =',
        answer: num(132),
        model: '132',
        recompute: () => (36 / (7 - 4)) * (7 + 4),
        points: [
          point(r`Links $36$ beads to $7 - 4 = 3$ parts`, { code: 'M' }),
          point(r`One part is $12$ beads`, { code: 'A', allow: ['84 or 48 seen'] }),
          point(r`$132$`, { code: 'A' }),
        ],
        guidance: r`$36$ is the difference between the shares and not the total, so it is worth $3$ parts.`,
      }),
      short({
        seconds: 70,
        stem: r`On a map, $4$ cm represents $1$ km. The scale of the map can be written in the form $1 : n$.

Work out the value of $n$.`,
        lines: 3,
        answerLabel: 'n =',
        answer: num(25000),
        model: '25000',
        recompute: () => (1 * 1000 * 100) / 4,
        points: [point(r`$1\ \text{km} = 100\,000\ \text{cm}$`, { code: 'M' }), point(r`$n = 25\,000$`, { code: 'A' })],
      }),
      short({
        seconds: 70,
        stem: r`A recipe for $12$ scones uses $225$ g of flour.

Work out the mass of flour needed for $20$ scones.`,
        lines: 3,
        answerLabel: 'Mass =',
        answer: num(375, { unit: 'g' }),
        model: '375',
        recompute: () => (225 / 12) * 20,
        points: [
          point(r`$225 \div 12$, or $20 \div 12$, or the mass for $4$ scones as $75$ g`, { code: 'M' }),
          point(r`$375$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 70,
        stem: r`It takes $6$ identical pumps $10$ hours to empty a tank.

Work out how long it would take $4$ of these pumps to empty the same tank, when each pump works at the same rate.`,
        lines: 2,
        answerLabel: 'Time =',
        answer: num(15, { unit: 'hours' }),
        model: '15',
        recompute: () => (6 * 10) / 4,
        points: [
          point(r`$6 \times 10 = 60$ pump-hours, or $10 \times \frac{6}{4}$`, { code: 'M' }),
          point(r`$15$`, { code: 'A', reject: ['6 hours 40 minutes'] }),
        ],
        guidance: 'Fewer pumps take longer, so the time must go up.',
      }),
      short({
        seconds: 100,
        stem: r`A train travels $91$ km in $65$ minutes.

Work out its average speed in kilometres per hour.`,
        lines: 3,
        answerLabel: 'Average speed =',
        answer: num(84, { unit: 'km/h' }),
        model: '84',
        recompute: () => 91 / (65 / 60),
        points: [
          point(r`Converts the time: $\frac{65}{60}$ hours, or $65$ minutes as $1\frac{1}{12}$ hours`, {
            code: 'M',
            allow: ['91 ÷ 65 = 1.4 km per minute'],
            reject: ['1.05 hours', '1.5 hours'],
          }),
          point(r`Divides the distance by their time in hours, or multiplies $1.4$ by $60$`, { code: 'M' }),
          point(r`$84$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 80,
        stem: r`A solid cuboid measures $12$ cm by $5$ cm by $4$ cm. It is made of metal with a density of $2.7\ \text{g/cm}^3$.

Work out the mass of the cuboid.`,
        lines: 3,
        answerLabel: 'Mass =',
        answer: num(648, { unit: 'g' }),
        model: '648',
        recompute: () => 12 * 5 * 4 * 2.7,
        points: [point(r`$12 \times 5 \times 4 \times 2.7$`, { code: 'M' }), point(r`$648$`, { code: 'A' })],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`$y$ is inversely proportional to the square of $x$. When $x = 2$, $y = 18$.

Work out the value of $y$ when $x = 6$.`,
        lines: 4,
        answerLabel: 'y =',
        answer: num(2),
        model: '2',
        recompute: () => (18 * 2 ** 2) / 6 ** 2,
        points: [
          point(r`$y = \dfrac{k}{x^2}$`, { code: 'M', allow: ['x multiplied by 3, so y divided by 3²'] }),
          point(r`$k = 72$`, { code: 'A', allow: ['18 ÷ 9 seen'] }),
          point(r`$2$`, { code: 'A', reject: ['6, from leaving out the square'] }),
        ],
      }),
      short({
        seconds: 120,
        tier: 'higher',
        stem: r`A runner covers $240$ m, correct to the nearest $10$ m, in $32.5$ seconds, correct to $1$ decimal place.

Work out the upper bound of the runner's average speed. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'Upper bound =',
        answer: num(7.55, { tolerance: 0.005, unit: 'm/s' }),
        model: '7.55',
        recompute: () => (240 + 10 / 2) / (32.5 - 0.1 / 2),
        points: [
          point(r`One correct bound: $245$, $235$, $32.45$ or $32.55$`, { code: 'B' }),
          point(r`Upper bound of the distance divided by lower bound of the time: $245 \div 32.45$`, { code: 'M' }),
          point(r`$7.55$`, { code: 'A', reject: ['7.38, from the ordinary values', '7.53, from both upper bounds'] }),
        ],
        guidance: 'To make a quotient as large as it can be, use the largest numerator and the smallest denominator.',
      }),
      shortParts({
        seconds: 130,
        tier: 'higher',
        stem: r`A velocity–time graph for a tram is made of three straight lines. They join these points in order. Each pair gives the time in seconds and then the velocity in metres per second.

$$
(0,\ 0) \qquad (10,\ 12) \qquad (40,\ 12) \qquad (60,\ 0)
$$`,
        parts: [
          part({
            prompt: r`Work out the acceleration of the tram in the first $10$ seconds.`,
            lines: 2,
            answerLabel: 'Acceleration =',
            answer: num(1.2, { unit: 'm/s²' }),
            model: '1.2',
            recompute: () => (12 - 0) / (10 - 0),
            points: [point(r`$1.2$`, { code: 'B' })],
          }),
          part({
            prompt: r`Work out the distance the tram travels in the $60$ seconds.`,
            lines: 4,
            answerLabel: 'Distance =',
            answer: num(540, { unit: 'm' }),
            model: '540',
            recompute: () => (10 * 12) / 2 + (40 - 10) * 12 + ((60 - 40) * 12) / 2,
            points: [
              point(r`Says or uses that distance is the area under the graph`, { code: 'M' }),
              point(r`$\frac{1}{2}(60 + 30) \times 12$, or $60 + 360 + 120$`, { code: 'M' }),
              point(r`$540$`, { code: 'A' }),
            ],
          }),
        ],
        guidance: 'On a velocity–time graph the gradient is the acceleration and the area is the distance.',
      }),
      recall({
        seconds: 90,
        stem: 'Write down the formulae for average speed, density and pressure.',
        lines: 4,
        points: [
          point(r`Average speed is distance divided by time`, { code: 'B', allow: ['A correct rearrangement'] }),
          point(r`Density is mass divided by volume`, { code: 'B', allow: ['A correct rearrangement'] }),
          point(r`Pressure is force divided by area`, {
            code: 'B',
            allow: ['A correct rearrangement'],
            reject: ['Force divided by volume'],
          }),
        ],
        model: r`Average speed $=$ distance $\div$ time. Density $=$ mass $\div$ volume. Pressure $=$ force $\div$ area.`,
      }),
    ],
  },
];
