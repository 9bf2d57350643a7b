import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Papers 1 and 2: particles, radioactivity, forces and motion. */
export const matterForcesAndMotion: TopicContent[] = [
  {
    number: '4',
    title: 'Particle model of matter',
    weights: { 1: 18 },
    questions: [
      short({
        stem: 'A metal block measures 5.0 cm by 4.0 cm by 2.0 cm. Its mass is 108 g.\n\nCalculate the density of the metal.',
        seconds: 100,
        lines: 4,
        answerLabel: 'Density =',
        answer: num(2.7, { unit: 'g/cm³' }),
        recompute: () => 108 / (5 * 4 * 2),
        model: '2.7',
        points: [
          r`Volume $= 5.0 \times 4.0 \times 2.0 = 40\ \text{cm}^3$`,
          point(r`Substitutes: $\rho = \dfrac{108}{40}$`, { allow: ['their volume in place of 40'] }),
          r`2.7 ($\text{g/cm}^3$)`,
        ],
        guidance: r`Find the volume first. With grams and cubic centimetres the density comes out in $\text{g/cm}^3$, so nothing needs converting.`,
      }),
      short({
        stem: r`A block of ice at 0 °C has a mass of 0.20 kg.

Specific latent heat of fusion of water $= 330\,000\ \text{J/kg}$

Calculate the energy needed to melt all the ice without changing its temperature.`,
        seconds: 75,
        lines: 3,
        answerLabel: 'Energy =',
        answer: num(66000, { unit: 'J' }),
        recompute: () => 0.2 * 330000,
        model: '66000',
        points: [r`Substitutes: $E = 0.20 \times 330\,000$`, point('66 000 (J)', { allow: ['6.6 × 10⁴ (J)'] })],
        guidance: r`The temperature stays the same, so $E = mL$ is enough. The equation with specific heat capacity is for a change of temperature.`,
      }),
      short({
        stem: 'Name the change of state in which a solid turns directly into a gas.',
        seconds: 30,
        answer: words('sublimation', 'sublimating', 'sublime', 'sublimes', 'subliming'),
        model: 'Sublimation',
        points: [point('Sublimation', { reject: ['evaporation', 'boiling'] })],
      }),
      short({
        stem: r`Oil has a density of $920\ \text{kg/m}^3$. A tank holds $0.50\ \text{m}^3$ of the oil.

Calculate the mass of the oil in the tank.`,
        seconds: 75,
        lines: 3,
        answerLabel: 'Mass =',
        answer: num(460, { unit: 'kg' }),
        recompute: () => 920 * 0.5,
        model: '460',
        points: [r`Rearranges: $m = 920 \times 0.50$`, '460 (kg)'],
      }),
      short({
        stem: 'State what is meant by the **internal energy** of a system.',
        seconds: 80,
        lines: 3,
        answer: wording(
          'the total kinetic energy and potential energy of all the particles',
          'the total kinetic energy and potential energy of all the particles in the system',
          'the total kinetic and potential energy of all the particles in the system',
          'the total kinetic and potential energy of the particles',
          'the sum of the kinetic and potential energies of all the particles',
          'the sum of the kinetic energy and potential energy of all the particles in the system',
          'the energy stored in the system by its particles, which is the total of their kinetic and potential energies',
        ),
        model: 'the total kinetic energy and potential energy of all the particles in the system',
        points: [
          point('Total kinetic energy (of the particles)', { allow: ['atoms or molecules for particles'] }),
          point('And potential energy of the particles', { reject: ['gravitational potential energy of the object'] }),
        ],
        guidance: 'Two kinds of energy are needed, and both belong to the particles.',
      }),
      recall({
        stem: 'A sealed container of fixed volume holds a gas. The gas is heated.\n\nExplain, in terms of particles, why the pressure of the gas increases.',
        seconds: 120,
        lines: 6,
        points: [
          point('Particles move faster', {
            allow: ['the kinetic energy of the particles increases'],
            reject: ['particles start to move', 'particles expand'],
          }),
          point('So they collide with the walls more often', {
            allow: ['more frequent collisions with the container'],
            ignore: ['more collisions with each other'],
          }),
          point('And each collision exerts a greater force on the walls', {
            allow: ['greater total force on the same area'],
          }),
        ],
        model:
          'Heating makes the particles move faster. They collide with the walls of the container more often, and each collision exerts a greater force on the wall, so the total force on the same area is greater.',
        guidance:
          'Say "more often" or "more frequently", not only "more collisions", and say what the particles collide with.',
      }),
      recall({
        stem: 'A solid is heated at a steady rate. While it melts, its temperature does not change.\n\nExplain, in terms of particles, why the temperature does not change.',
        seconds: 120,
        lines: 6,
        points: [
          point('The energy is used to weaken or overcome the forces between particles', {
            allow: ['break the bonds between particles'],
            reject: ['break the particles', 'break bonds within molecules'],
          }),
          'So the potential energy of the particles increases',
          point(
            'The average kinetic energy of the particles does not change (and temperature depends on kinetic energy)',
            {
              allow: ['the particles do not move faster'],
            },
          ),
        ],
        model:
          'While the solid melts, the energy supplied is used to overcome the forces between the particles, so their potential energy increases. The average kinetic energy of the particles does not change, and temperature depends on the kinetic energy, so it stays constant.',
        guidance:
          'Temperature goes with the kinetic energy of the particles. During a change of state it is the potential energy that rises.',
      }),
      recall({
        stem: 'Describe how to find the density of a small stone of irregular shape.',
        seconds: 260,
        lines: 10,
        points: [
          point('Measure the mass of the stone with a balance', {
            reject: ['weigh it with a newtonmeter, unless mass is then worked out'],
          }),
          point('Fill a displacement can with water up to its spout', {
            allow: ['partly fill a measuring cylinder and read the volume'],
          }),
          point('Lower the stone in until it is covered', { allow: ['the stone must be submerged'] }),
          point('Collect the displaced water and measure its volume with a measuring cylinder', {
            allow: ['read the new volume and take away the first reading'],
          }),
          r`Use $\text{density} = \dfrac{\text{mass}}{\text{volume}}$`,
        ],
        model:
          'Measure the mass of the stone with a balance. Fill a displacement can with water up to the spout. Lower the stone gently into the water until it is covered. Collect the water that comes out of the spout and measure its volume with a measuring cylinder. This is the volume of the stone. Divide the mass by the volume.',
        guidance:
          'The marks are for named apparatus and a stated measurement at each step, and for the final calculation.',
      }),
    ],
  },
  {
    number: '5',
    title: 'Atomic structure and radioactivity',
    weights: { 1: 18 },
    questions: [
      shortParts({
        stem: r`A nucleus of radium-226, $^{226}_{\ 88}\text{Ra}$, decays by emitting one alpha particle. It becomes a nucleus of radon (Rn).`,
        seconds: 120,
        parts: [
          part({
            prompt: 'Calculate the number of neutrons in a nucleus of radium-226.',
            answerLabel: 'Number of neutrons =',
            answer: num(138),
            recompute: () => 226 - 88,
            model: '138',
            points: ['138'],
          }),
          part({
            prompt: 'Give the mass number of the radon nucleus.',
            answerLabel: 'Mass number =',
            answer: num(222),
            recompute: () => 226 - 4,
            model: '222',
            points: ['222'],
          }),
          part({
            prompt: 'Give the atomic number of the radon nucleus.',
            answerLabel: 'Atomic number =',
            answer: num(86),
            recompute: () => 88 - 2,
            model: '86',
            points: ['86'],
          }),
        ],
        guidance: r`An alpha particle is $^{4}_{2}\text{He}$: two protons and two neutrons leave, so the mass number falls by 4 and the atomic number by 2.`,
      }),
      short({
        stem: 'A radioactive source has an activity of 960 Bq. Its half-life is 6.0 hours.\n\nCalculate the activity of the source after 24 hours.',
        seconds: 80,
        lines: 3,
        answerLabel: 'Activity =',
        answer: num(60, { unit: 'Bq' }),
        recompute: () => 960 / 2 ** (24 / 6),
        model: '60',
        points: ['Works out that 24 hours is 4 half-lives', '60 (Bq)'],
        guidance: r`Halve once for each half-life: $960 \rightarrow 480 \rightarrow 240 \rightarrow 120 \rightarrow 60$. Count the arrows, not the numbers.`,
      }),
      short({
        stem: 'The count rate from a source, corrected for background, falls from 640 counts per minute to 80 counts per minute in 45 days.\n\nCalculate the half-life of the source.',
        seconds: 90,
        lines: 3,
        answerLabel: 'Half-life =',
        answer: num(15, { unit: 'days' }),
        recompute: () => 45 / Math.log2(640 / 80),
        model: '15',
        points: [point('Finds that the count rate halves 3 times', { allow: ['640 → 320 → 160 → 80'] }), '15 (days)'],
        guidance: 'Count how many times the rate halves, then divide the time by that number.',
      }),
      short({
        stem: 'It is impossible to predict which nucleus in a radioactive sample will decay next, or when a particular nucleus will decay.\n\nGive the one word that describes this feature of radioactive decay.',
        seconds: 35,
        answer: words('random', 'randomness', 'randomly', 'stochastic'),
        model: 'Random',
        points: [point('Random', { ignore: ['spontaneous'] })],
      }),
      short({
        stem: 'In beta decay a neutron in the nucleus changes into another particle, which stays in the nucleus, and a fast-moving electron is emitted.\n\nName the particle that stays in the nucleus.',
        seconds: 40,
        answer: exactly(['proton', 'protons'], ['photon']),
        model: 'Proton',
        points: [point('Proton', { reject: ['electron', 'positron'] })],
        guidance:
          'The atomic number rises by one in beta decay, so the nucleus must gain a proton. The mass number does not change.',
      }),
      recall({
        stem: 'Alpha, beta and gamma radiation differ in how far they can pass through materials.\n\nFor each type of radiation, state what is needed to absorb all or most of it.',
        seconds: 90,
        lines: 4,
        points: [
          point('Alpha: a sheet of paper', { allow: ['skin', 'a few centimetres of air'] }),
          point('Beta: a few millimetres of aluminium', {
            allow: ['about one metre of air'],
            reject: ['aluminium foil'],
          }),
          point('Gamma: several centimetres of lead', {
            allow: ['thick lead', 'metres of concrete'],
            ignore: ['is stopped completely'],
          }),
        ],
        model:
          'Alpha radiation is absorbed by a sheet of paper, beta radiation by a few millimetres of aluminium, and most gamma radiation by several centimetres of lead.',
      }),
      recall({
        stem: 'In a famous experiment, alpha particles were directed at very thin gold foil.\n\nGive two observations made in the experiment and state what each one showed about the atom.',
        seconds: 170,
        lines: 8,
        points: [
          point('Most alpha particles passed straight through the foil', {
            allow: ['most were not deflected'],
            reject: ['all passed through'],
          }),
          'So most of the atom is empty space',
          point('A very small number were deflected through large angles', {
            allow: ['some bounced back'],
            reject: ['most bounced back'],
          }),
          point('So the mass, or the positive charge, of the atom is concentrated in a very small nucleus', {
            allow: ['there is a small, positively charged nucleus'],
          }),
        ],
        model:
          'Most alpha particles passed straight through the foil, which showed that most of the atom is empty space. A very small number were deflected through large angles, which showed that the mass and the positive charge are concentrated in a very small nucleus.',
        guidance:
          'Pair each observation with its own conclusion. Neutrons and energy levels were not found in this experiment.',
      }),
      recall({
        stem: 'Explain the difference between irradiation and radioactive contamination, and why the effects of contamination can go on for longer.',
        seconds: 130,
        lines: 6,
        points: [
          point('Irradiation is exposing an object to nuclear radiation', {
            allow: ['radiation reaches it from a source outside'],
            reject: ['the object becomes radioactive'],
          }),
          'Contamination is unwanted radioactive material getting on to or into an object',
          point(
            'Contamination goes on exposing the object until the material is removed or has decayed, but irradiation stops when the source is taken away',
            {
              allow: ['radioactive atoms stay on or in the object and keep emitting radiation'],
            },
          ),
        ],
        model:
          'Irradiation is exposing an object to nuclear radiation from a source outside it. Contamination is unwanted radioactive material getting on to or into an object. Irradiation stops when the source is taken away, but contaminating atoms stay and go on emitting radiation until they are removed or have decayed.',
      }),
    ],
  },
  {
    number: '6',
    title: 'Forces and their effects',
    weights: { 2: 20 },
    questions: [
      short({
        stem: r`An astronaut’s toolbox has a mass of 25 kg. On the Moon the gravitational field strength is $1.6\ \text{N/kg}$.

Calculate the weight of the toolbox on the Moon. Include the unit.`,
        seconds: 90,
        lines: 3,
        answerLabel: 'Weight =',
        answer: num(40, { unit: 'N', isUnitRequired: true }),
        recompute: () => 25 * 1.6,
        model: '40 N',
        points: [
          r`Substitutes: $W = 25 \times 1.6$`,
          '40',
          point('N', { allow: ['newton', 'newtons'], reject: ['kg', 'N/kg'] }),
        ],
        guidance: 'Mass is in kilograms and weight is a force in newtons. The unit carries a mark here.',
      }),
      short({
        stem: r`A spring has a spring constant of $25\ \text{N/m}$. A force stretches it from a length of 12 cm to a length of 20 cm. The limit of proportionality is not exceeded.

Calculate the force.`,
        seconds: 110,
        lines: 4,
        answerLabel: 'Force =',
        answer: num(2, { unit: 'N' }),
        recompute: () => 25 * (0.2 - 0.12),
        model: '2.0',
        points: [
          point('Extension = 8 cm = 0.08 m', { reject: ['20 cm used as the extension'] }),
          r`Substitutes: $F = 25 \times 0.08$`,
          '2.0 (N)',
        ],
        guidance: r`$F = ke$ needs the **extension**, which is the stretched length minus the original length, in metres.`,
      }),
      short({
        stem: 'A spring of spring constant 200 N/m is stretched by 0.10 m. The limit of proportionality is not exceeded.\n\nCalculate the elastic potential energy stored in the spring.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Energy =',
        answer: num(1, { unit: 'J' }),
        recompute: () => 0.5 * 200 * 0.1 ** 2,
        model: '1.0',
        points: [r`Substitutes: $E_\text{e} = \tfrac{1}{2} \times 200 \times 0.10^2$`, '1.0 (J)'],
        guidance: r`Square the extension only: $0.10^2 = 0.010$.`,
      }),
      short({
        stem: 'A crate is pushed 6.0 m across a floor by a horizontal force of 45 N in the direction of its movement.\n\nCalculate the work done by the force.',
        seconds: 70,
        lines: 3,
        answerLabel: 'Work done =',
        answer: num(270, { unit: 'J' }),
        recompute: () => 45 * 6,
        model: '270',
        points: [r`Substitutes: $W = 45 \times 6.0$`, point('270 (J)', { allow: ['270 N m'] })],
      }),
      short({
        stem: 'Here are five quantities:\n\ndistance, energy, mass, temperature, velocity\n\nName the one that is a vector quantity.',
        seconds: 35,
        answer: words('velocity'),
        model: 'Velocity',
        points: [point('Velocity', { reject: ['more than one quantity'] })],
        guidance: 'A vector has both size and direction. Each of the others has size only.',
      }),
      short({
        stem: 'Two forces act on a small boat. One is 6.0 N towards the north. The other is 8.0 N towards the east.\n\nDetermine the size of the resultant force. You may use a scale drawing.',
        tier: 'higher',
        seconds: 130,
        lines: 5,
        answerLabel: 'Resultant force =',
        answer: num(10, { range: { min: 9.8, max: 10.2 }, unit: 'N' }),
        recompute: () => Math.hypot(6, 8),
        model: '10',
        points: [
          point('Draws the two forces to the same scale at right angles', { allow: ['writes 6.0² + 8.0²'] }),
          point('Draws the resultant as the diagonal of the rectangle, or as the third side of the triangle', {
            allow: ['takes the square root of 100'],
          }),
          point('10 (N)', { allow: ['9.8 to 10.2 (N) from a scale drawing'] }),
        ],
      }),
      recall({
        stem: 'A swimmer pushes backwards on the water with her hands.\n\nUse ideas about pairs of forces to explain why she accelerates forwards.',
        seconds: 120,
        lines: 6,
        points: [
          point('The water exerts a force on the swimmer', { reject: ['the swimmer exerts a force on herself'] }),
          point(
            'This force is equal in size and opposite in direction to her force on the water (Newton’s third law)',
            {
              allow: ['equal and opposite'],
            },
          ),
          point('So the resultant force on the swimmer is forwards', {
            allow: ['the forward force is greater than the drag'],
            reject: ['the two forces balance'],
          }),
        ],
        model:
          'When the swimmer pushes the water backwards, the water exerts a force on the swimmer that is equal in size and opposite in direction. This force is forwards and is greater than the drag, so there is a resultant force forwards and she accelerates.',
        guidance:
          'The two forces of a pair act on different objects, so they cannot cancel. Say which object each force acts on.',
      }),
      recall({
        stem: 'Describe how a student could investigate the relationship between the force on a spring and its extension.',
        seconds: 240,
        lines: 9,
        points: [
          'Hangs the spring from a clamp and measures its original length with a ruler',
          point('Adds a known weight and measures the new length', { allow: ['masses for weights'] }),
          'Calculates extension as new length minus original length',
          'Repeats for several different weights',
          point('Takes readings at eye level, or uses a pointer or set square against the ruler, to reduce error', {
            allow: ['plots a graph of force against extension'],
            ignore: ['repeats to make it accurate'],
          }),
        ],
        model:
          'Hang the spring from a clamp beside a vertical ruler and measure its original length. Hang a known weight from it and measure the new length, reading the ruler at eye level. Extension is the new length minus the original length. Add more weights one at a time, and find the extension for each. Plot a graph of force against extension.',
      }),
    ],
  },
  {
    number: '7',
    title: 'Motion',
    weights: { 2: 20 },
    questions: [
      short({
        stem: 'A cyclist speeds up from 3.0 m/s to 11.0 m/s in 5.0 s.\n\nCalculate the acceleration of the cyclist.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Acceleration =',
        answer: num(1.6, { unit: 'm/s²' }),
        recompute: () => (11 - 3) / 5,
        model: '1.6',
        points: [r`Substitutes: $a = \dfrac{11.0 - 3.0}{5.0}$`, r`1.6 ($\text{m/s}^2$)`],
      }),
      short({
        stem: 'An aircraft starts from rest and accelerates uniformly along a runway. It reaches 60 m/s after 900 m.\n\nCalculate the acceleration of the aircraft.',
        seconds: 115,
        lines: 4,
        answerLabel: 'Acceleration =',
        answer: num(2, { unit: 'm/s²' }),
        recompute: () => (60 ** 2 - 0) / (2 * 900),
        model: '2.0',
        points: [
          r`Substitutes into $v^2 - u^2 = 2as$: $60^2 - 0 = 2 \times a \times 900$`,
          r`Rearranges: $a = \dfrac{60^2}{2 \times 900}$`,
          r`2.0 ($\text{m/s}^2$)`,
        ],
        guidance: r`No time is given, so use $v^2 - u^2 = 2as$. "Starts from rest" means $u = 0$.`,
      }),
      short({
        stem: 'A car of mass 1400 kg has a driving force of 3600 N. The resistive forces on it total 800 N.\n\nCalculate the acceleration of the car.',
        seconds: 110,
        lines: 4,
        answerLabel: 'Acceleration =',
        answer: num(2, { unit: 'm/s²' }),
        recompute: () => (3600 - 800) / 1400,
        model: '2.0',
        points: [
          r`Resultant force $= 3600 - 800 = 2800\ \text{N}$`,
          point(r`Rearranges: $a = \dfrac{2800}{1400}$`, { allow: ['their resultant force in place of 2800'] }),
          r`2.0 ($\text{m/s}^2$)`,
        ],
        guidance: r`In $F = ma$, $F$ is the **resultant** force. Take the resistive forces away first.`,
      }),
      shortParts({
        stem: 'A driver has a reaction time of 0.70 s. She is travelling at 20 m/s when she sees a hazard. After she presses the brake pedal the car travels 40 m before it stops.',
        seconds: 110,
        parts: [
          part({
            prompt: 'Calculate the thinking distance.',
            lines: 3,
            answerLabel: 'Thinking distance =',
            answer: num(14, { unit: 'm' }),
            recompute: () => 20 * 0.7,
            model: '14',
            points: [r`Substitutes: $s = 20 \times 0.70$`, '14 (m)'],
          }),
          part({
            prompt: 'Calculate the stopping distance.',
            answerLabel: 'Stopping distance =',
            answer: num(54, { unit: 'm' }),
            recompute: () => 20 * 0.7 + 40,
            model: '54',
            lines: 2,
            points: [
              point('Adds the braking distance: 14 + 40', { allow: ['their thinking distance in place of 14'] }),
              '54 (m)',
            ],
          }),
        ],
      }),
      short({
        stem: 'A walker moves in a straight line at constant speed. She is 120 m from home at a time of 40 s, and 300 m from home at a time of 160 s.\n\nCalculate her speed.',
        seconds: 80,
        lines: 3,
        answerLabel: 'Speed =',
        answer: num(1.5, { unit: 'm/s' }),
        recompute: () => (300 - 120) / (160 - 40),
        model: '1.5',
        points: [r`Substitutes: $\dfrac{300 - 120}{160 - 40}$`, '1.5 (m/s)'],
        guidance: 'Use the **change** in distance and the **change** in time. At 40 s she was already 120 m from home.',
      }),
      short({
        stem: 'A trolley of mass 2.0 kg moves at 3.0 m/s. It collides with a stationary trolley of mass 1.0 kg. The trolleys stick together.\n\nCalculate the speed of the trolleys immediately after the collision.',
        tier: 'higher',
        seconds: 120,
        lines: 5,
        answerLabel: 'Speed =',
        answer: num(2, { unit: 'm/s' }),
        recompute: () => (2 * 3) / (2 + 1),
        model: '2.0',
        points: [
          r`Momentum before $= 2.0 \times 3.0 = 6.0\ \text{kg m/s}$`,
          r`Uses conservation of momentum: $6.0 = (2.0 + 1.0) \times v$`,
          '2.0 (m/s)',
        ],
        guidance: 'After the collision both masses move together, so use the total mass, 3.0 kg.',
      }),
      recall({
        stem: 'A skydiver steps out of an aircraft and falls. Before the parachute opens, she reaches terminal velocity.\n\nExplain, in terms of forces, why her velocity increases and then becomes constant.',
        seconds: 200,
        lines: 9,
        points: [
          'At first her weight is greater than the air resistance, so she accelerates',
          point('As her speed increases, the air resistance increases', {
            allow: ['drag for air resistance'],
            reject: ['her weight decreases'],
          }),
          point('So the resultant force, and her acceleration, decrease', { reject: ['her speed decreases'] }),
          point('Until the air resistance is equal to her weight', { allow: ['the forces are balanced'] }),
          'The resultant force is then zero, so there is no acceleration',
        ],
        model:
          'At first her weight is greater than the air resistance, so there is a resultant force downwards and she accelerates. As her speed increases, the air resistance increases, so the resultant force and the acceleration get smaller. When the air resistance is equal to her weight the resultant force is zero, so she no longer accelerates and falls at a constant velocity.',
        guidance:
          'While the forces are becoming balanced she is still speeding up. It is the acceleration that falls, not the speed.',
      }),
      recall({
        stem: 'Speed affects both thinking distance and braking distance.\n\nGive **two** other factors that increase the thinking distance and **two** other factors that increase the braking distance.',
        seconds: 130,
        lines: 5,
        points: [
          point('Thinking distance: a first factor that makes reactions slower, such as tiredness', {
            allow: ['alcohol', 'drugs', 'distraction, such as a phone'],
            ignore: ['speed'],
          }),
          point('Thinking distance: a second factor of this kind, such as alcohol', {
            allow: ['tiredness', 'drugs', 'distraction'],
          }),
          point('Braking distance: a first factor, such as a wet or icy road', {
            allow: ['worn tyres', 'worn brakes', 'greater mass of the vehicle', 'downhill slope'],
            ignore: ['weather', 'speed'],
          }),
          point('Braking distance: a second factor, such as worn brakes', {
            allow: ['worn tyres', 'a wet or icy road', 'greater mass of the vehicle'],
          }),
        ],
        model:
          'Thinking distance is increased by tiredness and by alcohol. Braking distance is increased by a wet or icy road and by worn brakes.',
        guidance: '"Bad weather" or "road conditions" is too vague: say wet or icy.',
      }),
    ],
  },
];
