import { num, part, point, r, recall, short, shortParts, type TopicContent, wording } from './build.ts';
import { algebra } from './mathematics-forms.ts';

const inRadians = (degrees: number) => (degrees * Math.PI) / 180;
const inDegrees = (radians: number) => (radians * 180) / Math.PI;

/** Geometry and measures. */
export const geometryTopics: TopicContent[] = [
  {
    number: '8',
    title: 'Angles, area and volume',
    weights: { 1: 10, 3: 18 },
    questions: [
      short({
        seconds: 35,
        stem: r`Write $2.5\ \text{m}^2$ in square centimetres.`,
        answer: num(25000, { unit: 'cm²' }),
        model: '25000',
        recompute: () => 2.5 * 100 ** 2,
        points: [point(r`$25\,000$`, { code: 'B', reject: ['250, from multiplying by 100 only once'] })],
      }),
      short({
        seconds: 75,
        stem: r`Each interior angle of a regular polygon is $162^\circ$.

Work out the number of sides of the polygon.`,
        lines: 3,
        answerLabel: 'Number of sides =',
        answer: num(20),
        model: '20',
        recompute: () => 360 / (180 - 162),
        points: [
          point(r`Exterior angle $180^\circ - 162^\circ = 18^\circ$, or $180(n - 2) = 162n$`, { code: 'M' }),
          point(r`$20$`, { code: 'A' }),
        ],
        guidance: r`Interior and exterior angles make $180^\circ$ at each corner, and the exterior angles add up to $360^\circ$.`,
      }),
      short({
        seconds: 100,
        stem: r`Triangle $ABC$ is isosceles with $AB = AC$. Angle $BAC = 3x^\circ$ and angle $ABC = (x + 10)^\circ$.

Work out the size of angle $BAC$.`,
        lines: 4,
        answerLabel: 'Angle BAC =',
        answer: num(96, { unit: '°' }),
        model: '96',
        recompute: () => (3 * (180 - 2 * 10)) / (3 + 2),
        points: [
          point(r`Angle $ACB = (x + 10)^\circ$, seen or used`, { code: 'B' }),
          point(r`$3x + 2(x + 10) = 180$`, { code: 'M', allow: ['x = 32'] }),
          point(r`$96$`, { code: 'A', reject: ['32 as the final answer'] }),
        ],
        guidance: r`The equal angles are opposite the equal sides, so they are at $B$ and $C$. Answer the question asked: the angle, and not $x$.`,
      }),
      short({
        seconds: 70,
        stem: r`The parallel sides of a trapezium are $7$ cm and $11$ cm long. The perpendicular distance between them is $6$ cm.

Work out the area of the trapezium.`,
        lines: 2,
        answerLabel: 'Area =',
        answer: num(54, { unit: 'cm²' }),
        model: '54',
        recompute: () => ((7 + 11) / 2) * 6,
        points: [point(r`$\frac{1}{2}(7 + 11) \times 6$`, { code: 'M' }), point(r`$54$`, { code: 'A' })],
      }),
      short({
        seconds: 75,
        stem: r`The volume of a sphere of radius $r$ is $\frac{4}{3}\pi r^3$. A solid hemisphere has radius $6$ cm. Its volume is $k\pi\ \text{cm}^3$.

Work out the value of $k$.`,
        lines: 3,
        answerLabel: 'k =',
        answer: num(144),
        model: '144',
        recompute: () => ((4 / 3) * 6 ** 3) / 2,
        points: [
          point(r`$\frac{1}{2} \times \frac{4}{3} \times \pi \times 6^3$`, { code: 'M' }),
          point(r`$144$`, { code: 'A', reject: ['288, the whole sphere'] }),
        ],
      }),
      short({
        seconds: 110,
        stem: r`A sector of a circle has radius $9$ cm and angle $80^\circ$.

Work out the perimeter of the sector. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'Perimeter =',
        answer: num(30.6, { tolerance: 0.05, unit: 'cm' }),
        model: '30.6',
        recompute: () => (80 / 360) * 2 * Math.PI * 9 + 2 * 9,
        points: [
          point(r`Arc length: $\frac{80}{360} \times 2 \times \pi \times 9$`, {
            code: 'M',
            allow: ['4π', '12.6 or better'],
          }),
          point(r`Adds two radii: their arc $+\ 18$`, { code: 'M' }),
          point(r`$30.6$`, { code: 'A' }),
        ],
        guidance: 'The perimeter of a sector is the arc and the two radii.',
      }),
      short({
        seconds: 100,
        stem: r`A cylinder has radius $4$ cm and volume $600\ \text{cm}^3$.

Work out the height of the cylinder. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'Height =',
        answer: num(11.9, { tolerance: 0.05, unit: 'cm' }),
        model: '11.9',
        recompute: () => 600 / (Math.PI * 4 ** 2),
        points: [
          point(r`$\pi \times 4^2 \times h = 600$`, { code: 'M' }),
          point(r`$600 \div (\pi \times 4^2)$`, { code: 'M' }),
          point(r`$11.9$`, { code: 'A', allow: ['Answers that round to 11.9'] }),
        ],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`Two solid cones are mathematically similar. Their heights are $6$ cm and $9$ cm. The volume of the smaller cone is $160\ \text{cm}^3$.

Work out the volume of the larger cone.`,
        lines: 4,
        answerLabel: 'Volume =',
        answer: num(540, { unit: 'cm³' }),
        model: '540',
        recompute: () => 160 * (9 / 6) ** 3,
        points: [
          point(r`Length scale factor $\frac{9}{6} = 1.5$`, { code: 'B', allow: ['The ratio 2 : 3'] }),
          point(r`$160 \times 1.5^3$`, { code: 'M' }),
          point(r`$540$`, { code: 'A', reject: ['240, from 160 × 1.5', '360, from 160 × 1.5²'] }),
        ],
        guidance: 'Lengths multiply by the scale factor, areas by its square and volumes by its cube.',
      }),
      shortParts({
        seconds: 100,
        tier: 'higher',
        stem: r`$P$, $Q$ and $R$ are points on a circle with centre $O$. Angle $POQ = 124^\circ$. $R$ is on the major arc $PQ$.`,
        parts: [
          part({
            prompt: r`Work out the size of angle $PRQ$.`,
            answerLabel: 'Angle PRQ =',
            answer: num(62, { unit: '°' }),
            model: '62',
            recompute: () => 124 / 2,
            points: [point(r`$62$`, { code: 'B' })],
          }),
          part({
            prompt: 'Give a reason for your answer.',
            lines: 2,
            answer: wording(
              'The angle at the centre is twice the angle at the circumference',
              'Angle at the centre is double the angle at the circumference',
              'The angle at the circumference is half the angle at the centre',
              'Angle at centre is twice angle at circumference',
              'Angle at the centre is 2 × the angle at the circumference',
            ),
            model: 'The angle at the centre is twice the angle at the circumference',
            points: [
              point('The angle at the centre is twice the angle at the circumference', {
                code: 'B',
                allow: [
                  'double for twice',
                  'Any order, such as the angle at the circumference is half the angle at the centre',
                ],
                reject: ['The middle, the origin or O for the centre', 'The edge for the circumference'],
              }),
            ],
          }),
        ],
        guidance: 'A reason in a circle question is the theorem in words. Use the words centre and circumference.',
      }),
      recall({
        seconds: 100,
        stem: r`Write down the formula for the circumference of a circle of radius $r$, the formula for its area, and the formula for the volume of any prism.`,
        lines: 4,
        points: [
          point(r`Circumference $= 2\pi r$`, { code: 'B', allow: ['πd, where d is the diameter'] }),
          point(r`Area $= \pi r^2$`, { code: 'B', reject: ['(πr)²'] }),
          point('Volume of a prism is the area of its cross-section multiplied by its length', {
            code: 'B',
            allow: ['Area of the base × height'],
          }),
        ],
        model: r`Circumference $= 2\pi r$. Area $= \pi r^2$. Volume of a prism $=$ area of cross-section $\times$ length.`,
      }),
    ],
  },
  {
    number: '9',
    title: 'Pythagoras and trigonometry',
    weights: { 3: 22 },
    questions: [
      short({
        seconds: 100,
        stem: r`In triangle $PQR$, angle $PQR = 90^\circ$, $PQ = 9$ cm and $PR = 15.4$ cm.

Work out the length of $QR$. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'QR =',
        answer: num(12.5, { tolerance: 0.05, unit: 'cm' }),
        model: '12.5',
        recompute: () => Math.sqrt(15.4 ** 2 - 9 ** 2),
        points: [
          point(r`$15.4^2 - 9^2$, or $9^2 + QR^2 = 15.4^2$`, { code: 'M' }),
          point(r`Takes the square root: $\sqrt{156.16}$`, { code: 'M' }),
          point(r`$12.5$`, { code: 'A', reject: ['17.8, from adding the squares'] }),
        ],
        guidance: r`$PR$ is opposite the right angle, so it is the hypotenuse and the squares are subtracted.`,
      }),
      short({
        seconds: 75,
        stem: r`In triangle $ABC$, angle $ABC = 90^\circ$, angle $BAC = 38^\circ$ and $AC = 12$ cm.

Work out the length of $BC$. Give your answer correct to $3$ significant figures.`,
        lines: 3,
        answerLabel: 'BC =',
        answer: num(7.39, { tolerance: 0.005, unit: 'cm' }),
        model: '7.39',
        recompute: () => 12 * Math.sin(inRadians(38)),
        points: [
          point(r`$\sin 38^\circ = \dfrac{BC}{12}$`, { code: 'M' }),
          point(r`$7.39$`, { code: 'A', reject: ['9.46, from using cosine'] }),
        ],
      }),
      short({
        seconds: 100,
        stem: r`A ladder $6$ m long leans against a vertical wall. The foot of the ladder is on horizontal ground, $1.7$ m from the wall.

Work out the angle the ladder makes with the ground. Give your answer correct to $1$ decimal place.`,
        lines: 3,
        answerLabel: 'Angle =',
        answer: num(73.5, { tolerance: 0.05, unit: '°' }),
        model: '73.5',
        recompute: () => inDegrees(Math.acos(1.7 / 6)),
        points: [
          point(r`Identifies cosine: $\cos\theta = \dfrac{1.7}{6}$`, { code: 'M' }),
          point(r`$\theta = \cos^{-1}\left(\dfrac{1.7}{6}\right)$`, { code: 'M' }),
          point(r`$73.5$`, { code: 'A', reject: ['16.5, the angle with the wall'] }),
        ],
      }),
      short({
        seconds: 100,
        stem: r`A boat sails $14$ km due east and then $9$ km due north.

Work out the bearing of the boat from its starting point. Give your answer correct to the nearest degree.`,
        lines: 4,
        answerLabel: 'Bearing =',
        answer: num(57, { tolerance: 0.5, unit: '°' }),
        model: '057',
        recompute: () => inDegrees(Math.atan(14 / 9)),
        points: [
          point(
            r`Angle from north has $\tan\theta = \dfrac{14}{9}$, or angle from east has $\tan\alpha = \dfrac{9}{14}$`,
            { code: 'M' },
          ),
          point(r`Finds the angle with inverse tangent, and takes it from $90^\circ$ if it was measured from east`, {
            code: 'M',
          }),
          point(r`$057$`, { code: 'A', allow: ['57'], reject: ['033, the angle from east'] }),
        ],
        guidance:
          'A bearing is measured clockwise from north and written with three figures. A sketch shows which angle you need.',
      }),
      short({
        seconds: 80,
        tier: 'higher',
        stem: r`A cuboid measures $3$ cm by $4$ cm by $12$ cm.

Work out the length of the longest straight line that can be drawn between two corners of the cuboid.`,
        lines: 3,
        answerLabel: 'Length =',
        answer: num(13, { unit: 'cm' }),
        model: '13',
        recompute: () => Math.hypot(3, 4, 12),
        points: [
          point(r`$\sqrt{3^2 + 4^2 + 12^2}$, or a face diagonal and then Pythagoras again`, { code: 'M' }),
          point(r`$13$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`In triangle $ABC$, $AB = 8$ cm, $AC = 11$ cm and angle $BAC = 65^\circ$.

Work out the length of $BC$. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'BC =',
        answer: num(10.5, { tolerance: 0.05, unit: 'cm' }),
        model: '10.5',
        recompute: () => Math.sqrt(8 ** 2 + 11 ** 2 - 2 * 8 * 11 * Math.cos(inRadians(65))),
        points: [
          point(r`$8^2 + 11^2 - 2 \times 8 \times 11 \times \cos 65^\circ$`, { code: 'M' }),
          point(r`$110.6\ldots$`, { code: 'A', allow: ['The square root of their whole expression shown'] }),
          point(r`$10.5$`, { code: 'A' }),
        ],
        guidance: r`Work out $2 \times 8 \times 11 \times \cos 65^\circ$ before you subtract. Taking $176$ from $185$ and then multiplying by the cosine is the usual slip.`,
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`In triangle $ABC$, $BC = 9$ cm, angle $BAC = 52^\circ$ and angle $ABC = 71^\circ$.

Work out the length of $AC$. Give your answer correct to $3$ significant figures.`,
        lines: 4,
        answerLabel: 'AC =',
        answer: num(10.8, { tolerance: 0.05, unit: 'cm' }),
        model: '10.8',
        recompute: () => (9 * Math.sin(inRadians(71))) / Math.sin(inRadians(52)),
        points: [
          point(r`$\dfrac{AC}{\sin 71^\circ} = \dfrac{9}{\sin 52^\circ}$`, { code: 'M' }),
          point(r`$AC = \dfrac{9 \times \sin 71^\circ}{\sin 52^\circ}$`, { code: 'M' }),
          point(r`$10.8$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`In triangle $XYZ$, $XY = 8$ cm and $YZ = 12$ cm. The area of the triangle is $30\ \text{cm}^2$. Angle $XYZ$ is acute.

Work out the size of angle $XYZ$. Give your answer correct to $1$ decimal place.`,
        lines: 4,
        answerLabel: 'Angle XYZ =',
        answer: num(38.7, { tolerance: 0.05, unit: '°' }),
        model: '38.7',
        recompute: () => inDegrees(Math.asin(30 / (0.5 * 8 * 12))),
        points: [
          point(r`$\frac{1}{2} \times 8 \times 12 \times \sin Y = 30$`, { code: 'M' }),
          point(r`$\sin Y = 0.625$, or equivalent`, { code: 'A' }),
          point(r`$38.7$`, { code: 'A' }),
        ],
      }),
      recall({
        seconds: 90,
        stem: r`Write down the exact values of $\sin 30^\circ$, $\cos 45^\circ$ and $\tan 60^\circ$.`,
        lines: 3,
        points: [
          point(r`$\sin 30^\circ = \frac{1}{2}$`, { code: 'B', allow: ['0.5'] }),
          point(r`$\cos 45^\circ = \frac{\sqrt{2}}{2}$`, { code: 'B', allow: ['1/√2'], reject: ['0.707'] }),
          point(r`$\tan 60^\circ = \sqrt{3}$`, { code: 'B', reject: ['1.73'] }),
        ],
        model: r`$\sin 30^\circ = \frac{1}{2}$, $\cos 45^\circ = \frac{\sqrt{2}}{2}$ and $\tan 60^\circ = \sqrt{3}$.`,
        guidance: r`Half an equilateral triangle of side $2$ gives the values for $30^\circ$ and $60^\circ$. A right-angled isosceles triangle gives those for $45^\circ$.`,
      }),
      recall({
        seconds: 110,
        tier: 'higher',
        stem: r`In triangle $ABC$ the sides opposite $A$, $B$ and $C$ are $a$, $b$ and $c$. Write down the sine rule, the cosine rule for $a^2$, and a formula for the area that uses $a$, $b$ and angle $C$.`,
        lines: 5,
        points: [
          point(r`$\dfrac{a}{\sin A} = \dfrac{b}{\sin B} = \dfrac{c}{\sin C}$`, {
            code: 'B',
            allow: ['Each fraction upside down', 'Two of the three fractions'],
          }),
          point(r`$a^2 = b^2 + c^2 - 2bc\cos A$`, { code: 'B' }),
          point(r`Area $= \frac{1}{2}ab\sin C$`, { code: 'B' }),
        ],
        model: r`Sine rule: $\dfrac{a}{\sin A} = \dfrac{b}{\sin B} = \dfrac{c}{\sin C}$. Cosine rule: $a^2 = b^2 + c^2 - 2bc\cos A$. Area $= \frac{1}{2}ab\sin C$.`,
      }),
    ],
  },
  {
    number: '10',
    title: 'Vectors',
    weights: { 2: 10 },
    tier: 'higher',
    questions: [
      shortParts({
        seconds: 120,
        tier: 'higher',
        stem: r`$PQRS$ is a parallelogram. $M$ is the midpoint of $QR$.

$$
\overrightarrow{PQ} = \begin{pmatrix} 3 \\ -2 \end{pmatrix} \qquad \overrightarrow{PS} = \begin{pmatrix} -4 \\ 10 \end{pmatrix} \qquad \overrightarrow{PM} = \begin{pmatrix} x \\ y \end{pmatrix}
$$`,
        parts: [
          part({
            prompt: r`Work out the value of $x$.`,
            lines: 3,
            answerLabel: 'x =',
            answer: num(1),
            model: '1',
            recompute: () => 3 + -4 / 2,
            points: [
              point(
                r`$\overrightarrow{PM} = \overrightarrow{PQ} + \frac{1}{2}\overrightarrow{PS}$, or $3 + \frac{1}{2} \times (-4)$`,
                { code: 'M', allow: ['QR = PS stated or used'] },
              ),
              point(r`$1$`, { code: 'A', reject: ['5, from subtracting'] }),
            ],
          }),
          part({
            prompt: r`Work out the value of $y$.`,
            answerLabel: 'y =',
            answer: num(3),
            model: '3',
            recompute: () => -2 + 10 / 2,
            points: [point(r`$3$`, { code: 'A' })],
          }),
        ],
        guidance: r`Opposite sides of a parallelogram are equal vectors, so $\overrightarrow{QR} = \overrightarrow{PS}$. Go along $PQ$ and then half of $QR$.`,
      }),
      short({
        seconds: 70,
        tier: 'higher',
        stem: r`$A$ is the point $(1, 2)$ and $\overrightarrow{AB} = \begin{pmatrix} -5 \\ 12 \end{pmatrix}$.

Work out the length of $AB$.`,
        lines: 2,
        answerLabel: 'AB =',
        answer: num(13),
        model: '13',
        recompute: () => Math.hypot(-5, 12),
        points: [
          point(r`$\sqrt{(-5)^2 + 12^2}$`, { code: 'M', allow: ['√(5² + 12²)'] }),
          point(r`$13$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 70,
        tier: 'higher',
        stem: r`The vectors $\begin{pmatrix} 4 \\ -10 \end{pmatrix}$ and $\begin{pmatrix} 6 \\ k \end{pmatrix}$ are parallel.

Work out the value of $k$.`,
        lines: 2,
        answerLabel: 'k =',
        answer: num(-15),
        model: '-15',
        recompute: () => (6 / 4) * -10,
        points: [
          point(r`Multiplier $\frac{6}{4} = 1.5$, or $\dfrac{k}{-10} = \dfrac{6}{4}$`, { code: 'M' }),
          point(r`$-15$`, { code: 'A', reject: ['−8, from adding 2 to each component'] }),
        ],
        guidance: 'Parallel vectors are multiples of each other. Both components are multiplied by the same number.',
      }),
      shortParts({
        seconds: 140,
        tier: 'higher',
        stem: r`$p$ and $q$ are numbers such that

$$
p\begin{pmatrix} 2 \\ 1 \end{pmatrix} + q\begin{pmatrix} -1 \\ 3 \end{pmatrix} = \begin{pmatrix} 1 \\ 11 \end{pmatrix}
$$`,
        parts: [
          part({
            prompt: r`Work out the value of $p$.`,
            lines: 4,
            answerLabel: 'p =',
            answer: num(2),
            model: '2',
            recompute: () => (1 * 3 - -1 * 11) / (2 * 3 - -1 * 1),
            points: [
              point(r`$2p - q = 1$ and $p + 3q = 11$`, { code: 'M' }),
              point(r`Eliminates a letter: $7p = 14$ or $7q = 21$`, { code: 'M' }),
              point(r`$p = 2$`, { code: 'A' }),
            ],
          }),
          part({
            prompt: r`Work out the value of $q$.`,
            answerLabel: 'q =',
            answer: num(3),
            model: '3',
            recompute: () => (2 * 11 - 1 * 1) / (2 * 3 - -1 * 1),
            points: [point(r`$q = 3$`, { code: 'A' })],
          }),
        ],
      }),
      short({
        seconds: 80,
        tier: 'higher',
        stem: r`$OAB$ is a triangle. $\overrightarrow{OA} = 6\mathbf{a}$ and $\overrightarrow{OB} = 4\mathbf{b}$. $M$ is the midpoint of $AB$.

Work out $\overrightarrow{OM}$ in terms of $\mathbf{a}$ and $\mathbf{b}$. Give your answer in its simplest form.`,
        lines: 3,
        answer: algebra('3a + 2b', '2b + 3a'),
        model: '3a + 2b',
        points: [
          point(
            r`$\overrightarrow{AB} = 4\mathbf{b} - 6\mathbf{a}$, or $\overrightarrow{OM} = \frac{1}{2}(6\mathbf{a} + 4\mathbf{b})$`,
            { code: 'M' },
          ),
          point(r`$3\mathbf{a} + 2\mathbf{b}$`, { code: 'A' }),
        ],
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`$OAB$ is a triangle. $\overrightarrow{OA} = 3\mathbf{a}$ and $\overrightarrow{OB} = 3\mathbf{b}$. $P$ is the point on $AB$ such that $AP : PB = 1 : 2$.

Work out $\overrightarrow{OP}$ in terms of $\mathbf{a}$ and $\mathbf{b}$. Give your answer in its simplest form.`,
        lines: 4,
        answer: algebra('2a + b', 'b + 2a'),
        model: '2a + b',
        points: [
          point(r`$\overrightarrow{AB} = 3\mathbf{b} - 3\mathbf{a}$`, { code: 'B' }),
          point(r`$\overrightarrow{OP} = 3\mathbf{a} + \frac{1}{3}\overrightarrow{AB}$`, { code: 'M' }),
          point(r`$2\mathbf{a} + \mathbf{b}$`, { code: 'A', reject: ['a + 2b, from dividing AB in the ratio 2 : 1'] }),
        ],
        guidance: r`The ratio has $1 + 2 = 3$ parts, so $AP$ is one third of $AB$ and not one half.`,
      }),
      recall({
        seconds: 130,
        tier: 'higher',
        stem: r`$\overrightarrow{OA} = 2\mathbf{a}$, $\overrightarrow{OB} = 3\mathbf{b}$ and $\overrightarrow{OC} = 6\mathbf{a} - 6\mathbf{b}$.

Show that $A$, $B$ and $C$ lie on a straight line.`,
        lines: 6,
        points: [
          point(r`$\overrightarrow{AB} = 3\mathbf{b} - 2\mathbf{a}$`, {
            code: 'M',
            allow: ['Another pair of the three points'],
          }),
          point(r`$\overrightarrow{AC} = 4\mathbf{a} - 6\mathbf{b}$`, { code: 'A', allow: ['BC = 6a − 9b'] }),
          point(r`$\overrightarrow{AC} = -2\overrightarrow{AB}$, so they are parallel, and they share the point $A$`, {
            code: 'A',
            allow: ['BC = −3AB with the common point B'],
            reject: ['Parallel stated with no common point'],
          }),
        ],
        model: r`$\overrightarrow{AB} = 3\mathbf{b} - 2\mathbf{a}$ and $\overrightarrow{AC} = (6\mathbf{a} - 6\mathbf{b}) - 2\mathbf{a} = 4\mathbf{a} - 6\mathbf{b}$. So $\overrightarrow{AC} = -2\overrightarrow{AB}$: the two vectors are parallel and both start at $A$, so $A$, $B$ and $C$ lie on a straight line.`,
        guidance: 'Two statements finish the argument: one vector is a multiple of the other, and they share a point.',
      }),
    ],
  },
];
