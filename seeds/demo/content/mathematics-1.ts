import { num, part, point, r, recall, short, shortParts, type TopicContent, wording } from './build.ts';
import { algebra } from './mathematics-forms.ts';

/** Number. */
export const numberTopics: TopicContent[] = [
  {
    number: '1',
    title: 'Factors, standard form and accuracy',
    weights: { 1: 14 },
    questions: [
      short({
        seconds: 75,
        stem: r`Write $84$ as a product of its prime factors.`,
        lines: 3,
        answer: algebra('2 × 2 × 3 × 7', '2² × 3 × 7', '7 × 3 × 2²', '7 × 3 × 2 × 2'),
        model: '2² × 3 × 7',
        points: [
          point(r`Splits $84$ into a product with at least one prime factor, such as $2 \times 42$ or $7 \times 12$`, {
            code: 'M',
            allow: ['A factor tree or repeated division with one correct step'],
          }),
          point(r`$2 \times 2 \times 3 \times 7$ or $2^2 \times 3 \times 7$, factors in any order`, {
            code: 'A',
            ignore: ['A factor of 1 in the working'],
            reject: ['The primes left as a list: 2, 2, 3, 7'],
          }),
        ],
        guidance:
          'A product needs multiplication signs. A list of the primes, or an unfinished tree, does not earn the last mark.',
      }),
      shortParts({
        seconds: 110,
        stem: r`$A$ and $B$ are written as products of their prime factors.

$$
A = 2^3 \times 3 \times 5 \qquad B = 2^2 \times 3^2 \times 7
$$`,
        parts: [
          part({
            prompt: r`Work out the highest common factor of $A$ and $B$. Give your answer as an ordinary number.`,
            lines: 2,
            answerLabel: 'HCF =',
            answer: num(12),
            model: '12',
            recompute: () => 2 ** Math.min(3, 2) * 3 ** Math.min(1, 2),
            points: [point(r`$12$`, { code: 'B', allow: ['2² × 3 in the working'] })],
          }),
          part({
            prompt: r`Work out the lowest common multiple of $A$ and $B$. Give your answer as an ordinary number.`,
            lines: 3,
            answerLabel: 'LCM =',
            answer: num(2520),
            model: '2520',
            recompute: () => 2 ** Math.max(3, 2) * 3 ** Math.max(1, 2) * 5 * 7,
            points: [
              point(r`Uses the highest power of each prime: $2^3 \times 3^2 \times 5 \times 7$`, { code: 'M' }),
              point(r`$2520$`, { code: 'A' }),
            ],
          }),
        ],
        guidance:
          'For the HCF take the lower power of each prime that both share. For the LCM take the higher power of every prime that appears.',
      }),
      short({
        seconds: 75,
        stem: r`A red light flashes every $18$ seconds. A green light flashes every $24$ seconds. They have just flashed together.

Work out how many seconds pass before they next flash together.`,
        lines: 3,
        answerLabel: 'Time =',
        answer: num(72, { unit: 's' }),
        model: '72',
        recompute: () => {
          let time = 18;
          while (time % 24 !== 0) time += 18;
          return time;
        },
        points: [
          point(r`Lists at least three multiples of each number, or writes both as products of primes`, { code: 'M' }),
          point(r`$72$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 75,
        stem: r`Work out $(6 \times 10^7) \times (4 \times 10^{-3})$. Give your answer in standard form.`,
        lines: 2,
        answer: algebra('2.4 × 10⁵'),
        model: '2.4 × 10⁵',
        points: [
          point(r`$24 \times 10^4$ or $240\,000$`, { code: 'M', allow: ['6 × 4 = 24 and 7 + (−3) = 4 seen'] }),
          point(r`$2.4 \times 10^5$`, { code: 'A' }),
        ],
        guidance: r`$24 \times 10^4$ has the right value but is not in standard form: the first number must be at least $1$ and less than $10$.`,
      }),
      short({
        seconds: 110,
        stem: r`The mean mass of a grain of sand is $2.5 \times 10^{-3}$ grams. A bucket holds $10$ kilograms of this sand.

Work out an estimate for the number of grains in the bucket. Give your answer as an ordinary number.`,
        lines: 4,
        answerLabel: 'Number of grains =',
        answer: num(4_000_000),
        model: '4000000',
        recompute: () => (10 * 1000) / 2.5e-3,
        points: [
          point(r`$10\ \text{kg} = 10\,000\ \text{g}$`, { code: 'B', allow: ['1 × 10⁴ g'] }),
          point(r`Divides their mass by $2.5 \times 10^{-3}$`, { code: 'M' }),
          point(r`$4\,000\,000$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 75,
        stem: r`By rounding each number to $1$ significant figure, work out an estimate for

$$
\frac{39.7 \times 6.12}{0.483}
$$`,
        lines: 3,
        answer: num(480),
        model: '480',
        recompute: () => (40 * 6) / 0.5,
        points: [
          point(r`At least two of $40$, $6$ and $0.5$ seen`, { code: 'M' }),
          point(r`$480$`, { code: 'A', reject: ['503 or another value worked out without rounding first'] }),
        ],
        guidance: r`Dividing by $0.5$ doubles the number above it. Halving it instead is the usual slip.`,
      }),
      shortParts({
        seconds: 70,
        stem: r`The length of a pencil is $17.4$ cm, correct to $1$ decimal place.`,
        parts: [
          part({
            prompt: 'Write down the lower bound of the length.',
            answerLabel: 'Lower bound =',
            answer: num(17.35, { unit: 'cm' }),
            model: '17.35',
            recompute: () => 17.4 - 0.1 / 2,
            points: [point(r`$17.35$`, { code: 'B' })],
          }),
          part({
            prompt: 'Write down the upper bound of the length.',
            answerLabel: 'Upper bound =',
            answer: num(17.45, { unit: 'cm' }),
            model: '17.45',
            recompute: () => 17.4 + 0.1 / 2,
            points: [point(r`$17.45$`, { code: 'B', reject: ['17.44', '17.449'] })],
          }),
        ],
      }),
      recall({
        seconds: 60,
        stem: r`State what is meant by a prime number, and explain why $1$ is not prime.`,
        lines: 3,
        points: [
          point('A whole number with exactly two factors', {
            code: 'B',
            allow: ['A whole number greater than 1 whose only factors are 1 and itself'],
            reject: ['An odd number'],
          }),
          point(r`$1$ has only one factor`, { code: 'B' }),
        ],
        model: r`A prime number is a whole number with exactly two factors, $1$ and itself. The number $1$ is not prime because it has only one factor.`,
      }),
    ],
  },
  {
    number: '2',
    title: 'Fractions, decimals and percentages',
    weights: { 1: 12, 3: 10 },
    questions: [
      short({
        seconds: 30,
        stem: r`Write $0.035$ as a percentage.`,
        answer: num(3.5, { unit: '%' }),
        model: '3.5',
        recompute: () => 0.035 * 100,
        points: [point(r`$3.5$`, { code: 'B' })],
      }),
      short({
        seconds: 75,
        stem: r`Work out $\dfrac{5}{6} - \dfrac{3}{8}$. Give your answer as a fraction in its simplest form.`,
        lines: 3,
        answer: wording('11/24', '11 / 24'),
        model: '11/24',
        points: [
          point(
            r`Writes both fractions over a common denominator with at least one numerator right, such as $\frac{20}{24} - \frac{9}{24}$`,
            {
              code: 'M',
              allow: ['A common denominator of 48 or another multiple of 24'],
            },
          ),
          point(r`$\frac{11}{24}$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 100,
        stem: r`Work out $2\frac{1}{3} \times 1\frac{1}{5}$.`,
        lines: 4,
        answer: num(2.8),
        model: '2.8',
        recompute: () => (2 + 1 / 3) * (1 + 1 / 5),
        points: [
          point(r`Converts to improper fractions: $\frac{7}{3}$ and $\frac{6}{5}$`, { code: 'M' }),
          point(r`Multiplies numerators and denominators: $\frac{42}{15}$, or cancels first`, { code: 'M' }),
          point(r`$2\frac{4}{5}$, or equivalent`, { code: 'A', allow: ['14/5', '2.8'] }),
        ],
        guidance: 'Multiplying the whole numbers and the fractions separately leaves out two of the four products.',
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Write the recurring decimal $0.\dot{3}\dot{6}$ as a fraction in its simplest form.`,
        lines: 4,
        answer: wording('4/11', '4 / 11'),
        model: '4/11',
        points: [
          point(
            r`Multiplies by a power of ten that keeps the same digits after the point, such as $100x = 36.3636\ldots$`,
            { code: 'M' },
          ),
          point(r`Subtracts to get $99x = 36$`, { code: 'M' }),
          point(r`$\frac{4}{11}$`, { code: 'A', reject: ['36/99 as the final answer'] }),
        ],
        guidance: 'Two digits recur, so multiply by 100 before you subtract.',
      }),
      short({
        seconds: 75,
        stem: r`The price of a coat is £64. In a sale the price is reduced by $15\%$.

Work out the sale price.`,
        lines: 3,
        answerLabel: 'Sale price = £',
        answer: num(54.4),
        model: '54.40',
        recompute: () => 64 * (1 - 15 / 100),
        points: [
          point(r`$64 \times 0.85$, or finds $15\%$ of $64$ as $9.6$`, { code: 'M' }),
          point(r`$54.40$`, { code: 'A', allow: ['54.4'] }),
        ],
      }),
      short({
        seconds: 100,
        stem: r`A shopkeeper buys $40$ mugs for a total of £90. She sells all of them for £3.15 each.

Work out her percentage profit.`,
        lines: 4,
        answerLabel: 'Percentage profit =',
        answer: num(40, { unit: '%' }),
        model: '40',
        recompute: () => ((40 * 3.15 - 90) / 90) * 100,
        points: [
          point(r`$40 \times 3.15 = 126$, or $90 \div 40 = 2.25$`, { code: 'M' }),
          point(r`Divides the profit by the cost: $\frac{36}{90}$ or $\frac{0.90}{2.25}$`, {
            code: 'M',
            allow: ['126 ÷ 90'],
          }),
          point(r`$40$`, { code: 'A' }),
        ],
        guidance: 'Percentage profit is measured against what she paid, so divide by the cost and not by the takings.',
      }),
      short({
        seconds: 80,
        stem: r`After a rise of $12\%$, Priya's salary is £31 360.

Work out her salary before the rise.`,
        lines: 3,
        answerLabel: 'Salary before = £',
        answer: num(28000),
        model: '28000',
        recompute: () => 31360 / (1 + 12 / 100),
        points: [
          point(r`$31\,360 \div 1.12$`, { code: 'M', allow: ['31 360 is 112%, so 1% is 280'] }),
          point(r`$28\,000$`, { code: 'A' }),
        ],
        guidance: r`The $12\%$ is of the salary before the rise. Taking $12\%$ off £31 360 does not undo it.`,
      }),
      short({
        seconds: 100,
        stem: r`£2500 is invested at $3\%$ per year compound interest.

Work out the value of the investment after $4$ years. Give your answer to the nearest penny.`,
        lines: 4,
        answerLabel: 'Value = £',
        answer: num(2813.77, { tolerance: 0.005 }),
        model: '2813.77',
        recompute: () => 2500 * (1 + 3 / 100) ** 4,
        points: [
          point(r`Uses a multiplier of $1.03$, or finds the value after one year as $2575$`, { code: 'M' }),
          point(r`$2500 \times 1.03^4$, or a complete year-by-year method`, { code: 'M' }),
          point(r`$2813.77$`, { code: 'A', reject: ['2800, which is simple interest'] }),
        ],
      }),
      recall({
        seconds: 110,
        stem: r`Write down the multiplier for an increase of $7\%$ and the multiplier for a decrease of $7\%$. Explain why an increase of $7\%$ followed by a decrease of $7\%$ does not bring an amount back to where it started.`,
        lines: 5,
        points: [
          point(r`$1.07$ for the increase`, { code: 'B' }),
          point(r`$0.93$ for the decrease`, { code: 'B' }),
          point(r`The decrease is $7\%$ of a larger amount, so more is taken off than was added`, {
            code: 'B',
            allow: ['1.07 × 0.93 = 0.9951, which is not 1'],
          }),
        ],
        model: r`The multipliers are $1.07$ and $0.93$. The decrease is $7\%$ of the larger, increased amount, so more is taken off than was added: $1.07 \times 0.93 = 0.9951$, which is less than $1$.`,
      }),
    ],
  },
  {
    number: '3',
    title: 'Surds and indices',
    weights: { 1: 12 },
    tier: 'higher',
    questions: [
      short({
        seconds: 70,
        tier: 'higher',
        stem: r`$\sqrt{72}$ can be written in the form $k\sqrt{2}$, where $k$ is an integer.

Work out the value of $k$.`,
        lines: 2,
        answerLabel: 'k =',
        answer: num(6),
        model: '6',
        recompute: () => Math.sqrt(72) / Math.sqrt(2),
        points: [
          point(r`$\sqrt{36} \times \sqrt{2}$, or another correct product of roots that includes $\sqrt{2}$`, {
            code: 'M',
            allow: ['√4 × √9 × √2', '2√18 or 3√8'],
          }),
          point(r`$k = 6$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Work out the value of $8^{-\frac{2}{3}}$.`,
        lines: 3,
        answer: num(0.25),
        model: '0.25',
        recompute: () => 8 ** (-2 / 3),
        points: [
          point(r`Deals with one part of the index: $\sqrt[3]{8} = 2$, or $\dfrac{1}{8^{\frac{2}{3}}}$`, { code: 'M' }),
          point(r`$\frac{1}{4}$, or equivalent`, { code: 'A', allow: ['0.25'], reject: ['−4'] }),
        ],
        guidance:
          'The bottom of the index is a root, the top is a power and the minus sign is a reciprocal. A negative index does not make the answer negative.',
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Work out the value of $\left(\dfrac{16}{81}\right)^{\frac{3}{4}}$. Give your answer as a fraction in its simplest form.`,
        lines: 3,
        answer: wording('8/27', '8 / 27'),
        model: '8/27',
        points: [
          point(r`Takes the fourth root: $\frac{2}{3}$`, { code: 'M', allow: ['2³ or 3³ seen'] }),
          point(r`$\frac{8}{27}$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Solve $3^{2x - 1} = 81$.`,
        lines: 3,
        answerLabel: 'x =',
        answer: num(2.5),
        model: '2.5',
        recompute: () => (Math.log(81) / Math.log(3) + 1) / 2,
        points: [
          point(r`Writes $81$ as $3^4$, or $2x - 1 = 4$`, { code: 'M' }),
          point(r`$x = 2.5$, or equivalent`, { code: 'A', allow: ['5/2', '2½'] }),
        ],
        guidance: 'Write both sides as powers of the same number, then the indices must be equal.',
      }),
      short({
        seconds: 80,
        tier: 'higher',
        stem: r`A rectangle has length $(4 + \sqrt{3})$ cm and width $(4 - \sqrt{3})$ cm.

Work out the exact area of the rectangle.`,
        lines: 3,
        answerLabel: 'Area =',
        answer: num(13, { unit: 'cm²' }),
        model: '13',
        recompute: () => 4 ** 2 - 3,
        points: [
          point(r`$16 - 4\sqrt{3} + 4\sqrt{3} - 3$, at least three terms correct`, {
            code: 'M',
            allow: ['4² − (√3)²'],
          }),
          point(r`$13$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 80,
        tier: 'higher',
        stem: r`Expand and simplify $(5 + \sqrt{2})(3 - \sqrt{2})$. Give your answer in the form $a - b\sqrt{2}$, where $a$ and $b$ are integers.`,
        lines: 3,
        answer: algebra('13 − 2√2', '13 − 2sqrt(2)', '13 − 2sqrt2', '−2√2 + 13', 'a = 13, b = 2'),
        model: '13 − 2√2',
        points: [
          point(r`$15 - 5\sqrt{2} + 3\sqrt{2} - 2$, at least three terms correct`, { code: 'M' }),
          point(r`$13 - 2\sqrt{2}$`, { code: 'A' }),
        ],
        guidance: r`$\sqrt{2} \times (-\sqrt{2})$ is $-2$, which joins the $15$. Leaving it as $-\sqrt{4}$, or adding it, costs the last mark.`,
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Rationalise the denominator of

$$
\frac{10}{3 - \sqrt{7}}
$$

Give your answer in the form $a + b\sqrt{7}$, where $a$ and $b$ are integers.`,
        lines: 4,
        answer: algebra('15 + 5√7', '5√7 + 15', '15 + 5sqrt(7)', '15 + 5sqrt7', 'a = 15, b = 5'),
        model: '15 + 5√7',
        points: [
          point(r`Multiplies numerator and denominator by $3 + \sqrt{7}$`, { code: 'M' }),
          point(r`Denominator simplified to $9 - 7 = 2$`, { code: 'A' }),
          point(r`$15 + 5\sqrt{7}$`, { code: 'A', reject: ['(30 + 10√7)/2 as the final answer'] }),
        ],
      }),
      recall({
        seconds: 130,
        tier: 'higher',
        stem: r`$a$ is a positive number, and $m$ and $n$ are positive whole numbers. State what each of these means or equals.

$$
a^0 \qquad a^{-n} \qquad a^{\frac{1}{n}} \qquad a^{\frac{m}{n}}
$$`,
        lines: 5,
        points: [
          point(r`$a^0 = 1$`, { code: 'B' }),
          point(r`$a^{-n} = \dfrac{1}{a^n}$`, { code: 'B', allow: ['The reciprocal of a to the power n'] }),
          point(r`$a^{\frac{1}{n}} = \sqrt[n]{a}$`, { code: 'B', allow: ['The nth root of a'] }),
          point(r`$a^{\frac{m}{n}} = \left(\sqrt[n]{a}\right)^m$`, {
            code: 'B',
            allow: ['The nth root of a to the power m'],
          }),
        ],
        model: r`$a^0 = 1$. $a^{-n} = \dfrac{1}{a^n}$, the reciprocal of $a^n$. $a^{\frac{1}{n}} = \sqrt[n]{a}$, the $n$th root of $a$. $a^{\frac{m}{n}} = \left(\sqrt[n]{a}\right)^m$, the $n$th root of $a$ raised to the power $m$.`,
      }),
    ],
  },
];
