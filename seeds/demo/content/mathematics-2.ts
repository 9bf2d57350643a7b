import { num, part, point, r, recall, short, shortParts, type TopicContent } from './build.ts';
import { algebra } from './mathematics-forms.ts';

/** Algebra. */
export const algebraTopics: TopicContent[] = [
  {
    number: '4',
    title: 'Expressions, equations and inequalities',
    weights: { 1: 20 },
    questions: [
      short({
        seconds: 70,
        stem: r`Expand and simplify $(x + 5)(x - 3)$.`,
        lines: 3,
        answer: algebra('x² + 2x − 15', 'x² − 15 + 2x', '2x + x² − 15', '−15 + 2x + x²'),
        model: 'x² + 2x − 15',
        points: [
          point(r`At least three terms correct from $x^2 - 3x + 5x - 15$`, { code: 'M' }),
          point(r`$x^2 + 2x - 15$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 70,
        stem: r`Factorise fully $6x^2y - 9xy$.`,
        lines: 2,
        answer: algebra('3xy(2x − 3)', '3yx(2x − 3)', '(2x − 3)3xy'),
        model: '3xy(2x − 3)',
        points: [
          point(r`Takes out a correct common factor, such as $3x(2xy - 3y)$ or $xy(6x - 9)$`, { code: 'M' }),
          point(r`$3xy(2x - 3)$`, { code: 'A' }),
        ],
        guidance: 'Fully means that nothing common is left inside the bracket. Look for a number and for every letter.',
      }),
      short({
        seconds: 70,
        stem: r`$s = ut + \frac{1}{2}at^2$

Work out the value of $s$ when $u = 6$, $t = 4$ and $a = -2$.`,
        lines: 3,
        answerLabel: 's =',
        answer: num(8),
        model: '8',
        recompute: () => 6 * 4 + 0.5 * -2 * 4 ** 2,
        points: [
          point(r`$6 \times 4 + \frac{1}{2} \times (-2) \times 4^2$`, { code: 'M' }),
          point(r`$8$`, { code: 'A', reject: ['40, from losing the minus sign'] }),
        ],
        guidance: r`Only $t$ is squared. Work out $4^2$ before you multiply by $\frac{1}{2}$ and by $-2$.`,
      }),
      short({
        seconds: 100,
        stem: r`Solve $5(x - 2) = 2x + 11$.`,
        lines: 4,
        answerLabel: 'x =',
        answer: num(7),
        model: '7',
        recompute: () => (11 + 5 * 2) / (5 - 2),
        points: [
          point(r`Expands the bracket: $5x - 10$`, { code: 'M' }),
          point(r`Collects terms: $3x = 21$, or equivalent`, { code: 'M' }),
          point(r`$x = 7$`, { code: 'A' }),
        ],
      }),
      shortParts({
        seconds: 130,
        stem: r`Here are two simultaneous equations.

$$
\begin{aligned}
4x + 3y &= 5 \\
2x - y &= 10
\end{aligned}
$$`,
        parts: [
          part({
            prompt: r`Work out the value of $x$.`,
            lines: 4,
            answerLabel: 'x =',
            answer: num(3.5),
            model: '3.5',
            recompute: () => (5 + 3 * 10) / (4 + 3 * 2),
            points: [
              point(
                r`Makes the coefficients of one letter match, such as $6x - 3y = 30$, or substitutes $y = 2x - 10$`,
                { code: 'M' },
              ),
              point(r`Eliminates a letter: $10x = 35$ or $5y = -15$`, { code: 'M' }),
              point(r`$x = 3.5$`, { code: 'A', allow: ['7/2', '3½'] }),
            ],
          }),
          part({
            prompt: r`Work out the value of $y$.`,
            lines: 2,
            answerLabel: 'y =',
            answer: num(-3),
            model: '-3',
            recompute: () => 2 * ((5 + 3 * 10) / (4 + 3 * 2)) - 10,
            points: [point(r`$y = -3$`, { code: 'A' })],
          }),
        ],
        guidance: 'Put both values back into the equation you used least. A sign slip shows up at once.',
      }),
      short({
        seconds: 100,
        stem: r`$n$ is an integer and $7n - 4 < 2n + 19$.

Work out the largest possible value of $n$.`,
        lines: 4,
        answerLabel: 'n =',
        answer: num(4),
        model: '4',
        recompute: () => Math.ceil((19 + 4) / (7 - 2)) - 1,
        points: [
          point(r`Collects terms: $5n < 23$`, { code: 'M', allow: ['5n = 23'] }),
          point(r`$n < 4.6$`, { code: 'A', allow: ['4.6 seen as the critical value'] }),
          point(r`$4$`, { code: 'A', reject: ['5'] }),
        ],
      }),
      short({
        seconds: 150,
        stem: r`A rectangle has length $(3x + 1)$ cm and width $(x - 2)$ cm. The perimeter of the rectangle is $46$ cm.

Work out the area of the rectangle.`,
        lines: 6,
        answerLabel: 'Area =',
        answer: num(76, { unit: 'cm²' }),
        model: '76',
        recompute: () => {
          const x = (46 / 2 - 1 + 2) / (3 + 1);
          return (3 * x + 1) * (x - 2);
        },
        points: [
          point(r`Forms an equation: $2(3x + 1) + 2(x - 2) = 46$, or equivalent`, { code: 'M' }),
          point(r`$x = 6$`, { code: 'A' }),
          point(r`Substitutes their $x$ into both sides of the rectangle and multiplies: $19 \times 4$`, { code: 'M' }),
          point(r`$76$`, { code: 'A' }),
        ],
        guidance:
          'The perimeter is twice the sum of the sides. Using the sum once, or stopping at the value of x, is where marks go.',
      }),
      short({
        seconds: 120,
        tier: 'higher',
        stem: r`Make $x$ the subject of

$$
y = \frac{3x + 2}{x - 1}
$$`,
        lines: 5,
        answer: algebra(
          'x = (y + 2)/(y − 3)',
          '(y + 2)/(y − 3)',
          'x = (2 + y)/(y − 3)',
          'x = (−y − 2)/(3 − y)',
          'x = −(y + 2)/(3 − y)',
        ),
        model: 'x = (y + 2)/(y − 3)',
        points: [
          point(r`Multiplies by the denominator: $y(x - 1) = 3x + 2$`, { code: 'M' }),
          point(r`Expands and collects the terms in $x$ on one side: $xy - 3x = y + 2$`, { code: 'M' }),
          point(r`Factorises: $x(y - 3) = y + 2$`, { code: 'M' }),
          point(r`$x = \dfrac{y + 2}{y - 3}$, or equivalent`, { code: 'A' }),
        ],
        guidance: r`$x$ appears twice, so bring both terms to one side and take $x$ out as a factor.`,
      }),
      recall({
        seconds: 70,
        stem: 'Explain the difference between an equation and an identity.',
        lines: 4,
        points: [
          point('An equation is true only for certain values of the letter', {
            code: 'B',
            allow: ['An equation can be solved'],
          }),
          point('An identity is true for every value of the letter', {
            code: 'B',
            allow: ['The two sides of an identity are the same expression in different forms'],
          }),
        ],
        model: r`An equation, such as $2x + 1 = 7$, is true only for certain values of the letter, which you find by solving it. An identity, such as $2(x + 1) \equiv 2x + 2$, is true for every value of the letter.`,
      }),
      recall({
        seconds: 130,
        tier: 'higher',
        stem: r`$n$ is a positive integer. Prove that $(2n + 3)^2 - (2n + 1)^2$ is always a multiple of $8$.`,
        lines: 6,
        points: [
          point(r`Expands both squares: $4n^2 + 12n + 9$ and $4n^2 + 4n + 1$`, {
            code: 'M',
            allow: ['Difference of two squares: (2n + 3 + 2n + 1)(2n + 3 − 2n − 1)'],
          }),
          point(r`Simplifies to $8n + 8$`, { code: 'A', allow: ['2(4n + 4)'] }),
          point(r`Writes $8(n + 1)$ and says that this is a multiple of $8$ because $n + 1$ is an integer`, {
            code: 'A',
            allow: ['Says that 8n and 8 are both multiples of 8'],
            reject: ['Testing particular values of n'],
          }),
        ],
        model: r`$(2n + 3)^2 - (2n + 1)^2 = (4n^2 + 12n + 9) - (4n^2 + 4n + 1) = 8n + 8 = 8(n + 1)$. As $n + 1$ is an integer, $8(n + 1)$ is always a multiple of $8$.`,
        guidance:
          'A proof must work for every n, so no number of examples earns the marks. End by saying what you have shown.',
      }),
    ],
  },
  {
    number: '5',
    title: 'Quadratics and algebraic fractions',
    weights: { 2: 18 },
    tier: 'higher',
    questions: [
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Work out the positive solution of $2x^2 - x - 21 = 0$.`,
        lines: 3,
        answerLabel: 'x =',
        answer: num(3.5),
        model: '3.5',
        recompute: () => (1 + Math.sqrt(1 + 4 * 2 * 21)) / (2 * 2),
        points: [
          point(r`$(2x - 7)(x + 3)$, or substitutes correctly into the quadratic formula`, { code: 'M' }),
          point(r`$x = 3.5$, or equivalent`, {
            code: 'A',
            allow: ['7/2', '3½'],
            ignore: ['x = −3 given as well, if 3.5 is chosen'],
          }),
        ],
      }),
      shortParts({
        seconds: 130,
        tier: 'higher',
        stem: r`Here is a quadratic equation.

$$
2x^2 + 5x - 4 = 0
$$

Use the quadratic formula to answer both parts. Give each answer correct to $2$ decimal places.`,
        parts: [
          part({
            prompt: 'Work out the positive solution.',
            lines: 4,
            answerLabel: 'x =',
            answer: num(0.64, { tolerance: 0.005 }),
            model: '0.64',
            recompute: () => (-5 + Math.sqrt(5 ** 2 - 4 * 2 * -4)) / (2 * 2),
            points: [
              point(r`Substitutes into the formula: $\dfrac{-5 \pm \sqrt{5^2 - 4 \times 2 \times (-4)}}{2 \times 2}$`, {
                code: 'M',
              }),
              point(r`$0.64$`, { code: 'A', allow: ['0.637 or better'] }),
            ],
          }),
          part({
            prompt: 'Work out the negative solution.',
            lines: 2,
            answerLabel: 'x =',
            answer: num(-3.14, { tolerance: 0.005 }),
            model: '-3.14',
            recompute: () => (-5 - Math.sqrt(5 ** 2 - 4 * 2 * -4)) / (2 * 2),
            points: [point(r`$-3.14$`, { code: 'A', allow: ['−3.137 or better'] })],
          }),
        ],
        guidance: r`$-4 \times 2 \times (-4)$ is $+32$, so the number under the root is $57$. The whole numerator is divided by $4$.`,
      }),
      shortParts({
        seconds: 110,
        tier: 'higher',
        stem: r`$x^2 + 6x - 5$ can be written in the form $(x + a)^2 + b$, where $a$ and $b$ are integers.`,
        parts: [
          part({
            prompt: r`Work out the value of $a$.`,
            answerLabel: 'a =',
            answer: num(3),
            model: '3',
            recompute: () => 6 / 2,
            points: [point(r`$a = 3$`, { code: 'B' })],
          }),
          part({
            prompt: r`Work out the value of $b$.`,
            lines: 2,
            answerLabel: 'b =',
            answer: num(-14),
            model: '-14',
            recompute: () => -5 - (6 / 2) ** 2,
            points: [point(r`$b = -14$`, { code: 'B' })],
          }),
          part({
            prompt: r`Write down the $x$-coordinate of the turning point of the graph of $y = x^2 + 6x - 5$.`,
            answerLabel: 'x =',
            answer: num(-3),
            model: '-3',
            recompute: () => -6 / 2,
            points: [point(r`$-3$`, { code: 'B', reject: ['3'] })],
          }),
        ],
        guidance: r`$(x + 3)^2$ brings an extra $9$ with it, so take $9$ away as well as $5$.`,
      }),
      short({
        seconds: 100,
        tier: 'higher',
        stem: r`$x$ is an integer and $x^2 - 2x - 15 < 0$.

Work out how many possible values of $x$ there are.`,
        lines: 4,
        answerLabel: 'Number of values =',
        answer: num(7),
        model: '7',
        recompute: () => Array.from({ length: 201 }, (_, i) => i - 100).filter((x) => x ** 2 - 2 * x - 15 < 0).length,
        points: [
          point(r`Factorises: $(x - 5)(x + 3)$, or finds the critical values $5$ and $-3$`, { code: 'M' }),
          point(r`$-3 < x < 5$`, { code: 'A', allow: ['The list −2, −1, 0, 1, 2, 3, 4'] }),
          point(r`$7$`, { code: 'A', reject: ['9, from including −3 and 5'] }),
        ],
      }),
      short({
        seconds: 100,
        tier: 'higher',
        stem: r`Simplify fully

$$
\frac{x^2 - 9}{x^2 + 5x + 6}
$$`,
        lines: 4,
        answer: algebra('(x − 3)/(x + 2)', '(−3 + x)/(x + 2)', '(x − 3) ÷ (x + 2)', '(x − 3)/(2 + x)'),
        model: '(x − 3)/(x + 2)',
        points: [
          point(r`Factorises the numerator: $(x - 3)(x + 3)$`, { code: 'M' }),
          point(r`Factorises the denominator: $(x + 2)(x + 3)$`, { code: 'M' }),
          point(r`$\dfrac{x - 3}{x + 2}$`, { code: 'A', reject: ['Further cancelling of x, which is not a factor'] }),
        ],
        guidance:
          'Only a factor of the whole numerator and the whole denominator may be cancelled, so factorise both first.',
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Write as a single fraction in its simplest form

$$
\frac{3}{x + 2} + \frac{1}{x - 1}
$$`,
        lines: 5,
        answer: algebra('(4x − 1)/((x + 2)(x − 1))', '(4x − 1)/((x − 1)(x + 2))', '(4x − 1)/(x² + x − 2)'),
        model: '(4x − 1)/((x + 2)(x − 1))',
        points: [
          point(r`Uses the common denominator $(x + 2)(x - 1)$`, { code: 'M' }),
          point(r`Numerator $3(x - 1) + (x + 2)$`, { code: 'M', allow: ['3x − 3 + x + 2'] }),
          point(r`$\dfrac{4x - 1}{(x + 2)(x - 1)}$, or equivalent`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 150,
        tier: 'higher',
        stem: r`Work out the positive solution of

$$
\frac{2}{x} + \frac{6}{x + 1} = 3
$$`,
        lines: 6,
        answerLabel: 'x =',
        answer: num(2),
        model: '2',
        // 2(x + 1) + 6x = 3x(x + 1), so 3x² + (3 − 2 − 6)x − 2 = 0
        recompute: () => {
          const b = 3 - 2 - 6;
          return (-b + Math.sqrt(b ** 2 + 4 * 3 * 2)) / (2 * 3);
        },
        points: [
          point(r`Clears the fractions: $2(x + 1) + 6x = 3x(x + 1)$`, { code: 'M' }),
          point(r`$3x^2 - 5x - 2 = 0$, or equivalent`, { code: 'A' }),
          point(r`Factorises: $(3x + 1)(x - 2)$, or substitutes correctly into the formula`, { code: 'M' }),
          point(r`$x = 2$`, { code: 'A', ignore: ['x = −1/3 given as well, if 2 is chosen'] }),
        ],
        guidance: r`Multiply every term by $x(x + 1)$, the $3$ on the right included.`,
      }),
      short({
        seconds: 160,
        tier: 'higher',
        stem: r`The line $y = x + 3$ meets the circle $x^2 + y^2 = 29$ at two points.

Work out the $x$-coordinate of the point where $x$ is positive.`,
        lines: 6,
        answerLabel: 'x =',
        answer: num(2),
        model: '2',
        // 2x² + 6x + 9 − 29 = 0
        recompute: () => (-2 * 3 + Math.sqrt((2 * 3) ** 2 - 4 * 2 * (3 ** 2 - 29))) / (2 * 2),
        points: [
          point(r`Substitutes: $x^2 + (x + 3)^2 = 29$`, { code: 'M' }),
          point(r`$2x^2 + 6x - 20 = 0$, or equivalent`, { code: 'A' }),
          point(r`Factorises: $(x + 5)(x - 2)$, or substitutes correctly into the formula`, { code: 'M' }),
          point(r`$x = 2$`, { code: 'A' }),
        ],
      }),
      recall({
        seconds: 100,
        tier: 'higher',
        stem: r`Write down the quadratic formula for the solutions of $ax^2 + bx + c = 0$. State what you can say about the solutions when $b^2 - 4ac$ is negative.`,
        lines: 4,
        points: [
          point(r`Numerator $-b \pm \sqrt{b^2 - 4ac}$`, { code: 'B' }),
          point(r`The whole numerator divided by $2a$`, { code: 'B', reject: ['Only the root divided by 2a'] }),
          point('There are no real solutions', {
            code: 'B',
            allow: ['There are no solutions', 'The graph does not meet the x-axis'],
          }),
        ],
        model: r`$x = \dfrac{-b \pm \sqrt{b^2 - 4ac}}{2a}$. When $b^2 - 4ac$ is negative there are no real solutions, because a negative number has no real square root.`,
      }),
    ],
  },
  {
    number: '6',
    title: 'Sequences, functions and graphs',
    weights: { 1: 12, 2: 10 },
    questions: [
      short({
        seconds: 70,
        stem: r`Here are the first four terms of a linear sequence.

$$
5 \qquad 8 \qquad 11 \qquad 14
$$

Work out an expression, in terms of $n$, for the $n$th term.`,
        lines: 2,
        answer: algebra('3n + 2', '2 + 3n', '3 × n + 2', 'n × 3 + 2', '5 + 3(n − 1)'),
        model: '3n + 2',
        points: [
          point(r`$3n$ seen`, { code: 'M', reject: ['n + 3'] }),
          point(r`$3n + 2$, or equivalent`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 70,
        stem: r`The $n$th term of a sequence is $7n - 4$. One term of the sequence is $143$.

Work out the value of $n$ for this term.`,
        lines: 2,
        answerLabel: 'n =',
        answer: num(21),
        model: '21',
        recompute: () => (143 + 4) / 7,
        points: [point(r`$7n - 4 = 143$`, { code: 'M' }), point(r`$21$`, { code: 'A' })],
      }),
      short({
        seconds: 35,
        stem: r`The first term of a geometric progression is $5$. Each term is twice the term before it.

Work out the $6$th term.`,
        lines: 2,
        answer: num(160),
        model: '160',
        recompute: () => 5 * 2 ** (6 - 1),
        points: [point(r`$160$`, { code: 'B', reject: ['320, which is the 7th term'] })],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Here are the first four terms of a quadratic sequence.

$$
3 \qquad 9 \qquad 19 \qquad 33
$$

Work out the $50$th term.`,
        lines: 5,
        answer: num(5001),
        model: '5001',
        // half the second difference of 3, 9, 19, then what is left over
        recompute: () => {
          const a = (19 - 9 - (9 - 3)) / 2;
          const b = 9 - 3 - 3 * a;
          return a * 50 ** 2 + b * 50 + (3 - a - b);
        },
        points: [
          point(r`Finds that the second difference is $4$`, { code: 'M' }),
          point(r`$n$th term $2n^2 + 1$`, { code: 'A' }),
          point(r`$5001$`, { code: 'A' }),
        ],
        guidance: r`The coefficient of $n^2$ is half the second difference. Take $2n^2$ from each term to see what is left.`,
      }),
      short({
        seconds: 70,
        stem: r`Work out the gradient of the straight line through the points $(-2, 7)$ and $(4, -5)$.`,
        lines: 2,
        answerLabel: 'Gradient =',
        answer: num(-2),
        model: '-2',
        recompute: () => (-5 - 7) / (4 - -2),
        points: [
          point(r`$\dfrac{-5 - 7}{4 - (-2)}$, or equivalent`, { code: 'M' }),
          point(r`$-2$`, { code: 'A', reject: ['2', '−1/2'] }),
        ],
      }),
      shortParts({
        seconds: 80,
        stem: r`A straight line has equation $2y - 6x = 10$.`,
        parts: [
          part({
            prompt: 'Work out the gradient of the line.',
            lines: 2,
            answerLabel: 'Gradient =',
            answer: num(3),
            model: '3',
            recompute: () => 6 / 2,
            points: [point(r`$3$`, { code: 'B' })],
          }),
          part({
            prompt: r`The line crosses the $y$-axis at $(0, k)$. Write down the value of $k$.`,
            answerLabel: 'k =',
            answer: num(5),
            model: '5',
            recompute: () => 10 / 2,
            points: [point(r`$5$`, { code: 'B' })],
          }),
        ],
        guidance: r`Rearrange to $y = mx + c$ first. Reading $6$ or $-6$ from the equation as it stands is the usual slip.`,
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Line $\mathbf{L}$ has equation $y = 4x - 3$. Line $\mathbf{M}$ is perpendicular to $\mathbf{L}$ and passes through the point $(8, 1)$.

Work out the $y$-coordinate of the point where $\mathbf{M}$ crosses the $y$-axis.`,
        lines: 4,
        answerLabel: 'y =',
        answer: num(3),
        model: '3',
        recompute: () => 1 - (-1 / 4) * 8,
        points: [
          point(r`Gradient of $\mathbf{M}$ is $-\frac{1}{4}$`, { code: 'M' }),
          point(r`Substitutes the point: $1 = -\frac{1}{4} \times 8 + c$`, { code: 'M' }),
          point(r`$3$`, { code: 'A', allow: ['(0, 3) in the working'] }),
        ],
      }),
      shortParts({
        seconds: 140,
        tier: 'higher',
        stem: r`The functions $\mathrm{f}$ and $\mathrm{g}$ are given by

$$
\mathrm{f}(x) = 3x - 4 \qquad \mathrm{g}(x) = x^2 + 1
$$`,
        parts: [
          part({
            prompt: r`Work out the value of $\mathrm{fg}(2)$.`,
            lines: 2,
            answer: num(11),
            model: '11',
            recompute: () => 3 * (2 ** 2 + 1) - 4,
            points: [
              point(r`$\mathrm{g}(2) = 5$, or $3(x^2 + 1) - 4$`, { code: 'M' }),
              point(r`$11$`, { code: 'A', reject: ['5, which is gf(2)'] }),
            ],
          }),
          part({
            prompt: r`Work out the value of $\mathrm{f}^{-1}(8)$.`,
            lines: 2,
            answer: num(4),
            model: '4',
            recompute: () => (8 + 4) / 3,
            points: [
              point(r`$3x - 4 = 8$, or $\mathrm{f}^{-1}(x) = \dfrac{x + 4}{3}$`, { code: 'M' }),
              point(r`$4$`, { code: 'A' }),
            ],
          }),
        ],
        guidance: r`$\mathrm{fg}(2)$ means do $\mathrm{g}$ first and then $\mathrm{f}$.`,
      }),
      recall({
        seconds: 120,
        tier: 'higher',
        stem: r`A line has equation $y = mx + c$, where $m$ is not zero. State what $m$ and $c$ tell you about the line, and give the gradient of a line parallel to it and of a line perpendicular to it.`,
        lines: 5,
        points: [
          point(r`$m$ is the gradient`, { code: 'B', allow: ['How steep the line is'] }),
          point(r`$c$ is where the line crosses the $y$-axis`, {
            code: 'B',
            allow: ['The y-intercept'],
            reject: ['The x-intercept'],
          }),
          point(r`A parallel line has gradient $m$`, { code: 'B', allow: ['The same gradient'] }),
          point(r`A perpendicular line has gradient $-\dfrac{1}{m}$`, {
            code: 'B',
            allow: ['The negative reciprocal'],
            reject: ['−m', '1/m'],
          }),
        ],
        model: r`$m$ is the gradient of the line and $c$ is the $y$-intercept: the line crosses the $y$-axis at $(0, c)$. A parallel line also has gradient $m$. A perpendicular line has gradient $-\dfrac{1}{m}$.`,
      }),
    ],
  },
];
