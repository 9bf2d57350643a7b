import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 1: energy and electricity. */
export const energyAndElectricity: TopicContent[] = [
  {
    number: '1',
    title: 'Energy stores and transfers',
    weights: { 1: 22 },
    questions: [
      short({
        stem: r`A climber of mass 40 kg climbs a vertical height of 2.5 m.

Gravitational field strength $= 9.8\ \text{N/kg}$

Calculate the increase in the climber’s gravitational potential energy.`,
        seconds: 75,
        lines: 3,
        answerLabel: 'Increase in energy =',
        answer: num(980, { unit: 'J' }),
        recompute: () => 40 * 9.8 * 2.5,
        model: '980',
        points: [r`Substitutes: $E_\text{p} = 40 \times 9.8 \times 2.5$`, '980 (J)'],
        guidance: r`Use $E_\text{p} = mgh$. Mass goes in as kilograms; do not change it into a weight and then multiply by $g$ again.`,
      }),
      shortParts({
        stem: r`A ball of mass 0.060 kg is thrown vertically upwards. It leaves the hand at 20 m/s. Air resistance is negligible.

Gravitational field strength $= 9.8\ \text{N/kg}$`,
        seconds: 180,
        parts: [
          part({
            prompt: 'Calculate the kinetic energy of the ball as it leaves the hand.',
            lines: 3,
            answerLabel: 'Kinetic energy =',
            answer: num(12, { unit: 'J' }),
            recompute: () => 0.5 * 0.06 * 20 ** 2,
            model: '12',
            points: [r`Substitutes: $E_\text{k} = \tfrac{1}{2} \times 0.060 \times 20^2$`, '12 (J)'],
          }),
          part({
            prompt: 'Calculate the greatest height the ball reaches above the hand.',
            lines: 4,
            answerLabel: 'Height =',
            answer: num(20.4, { range: { min: 20, max: 20.5 }, unit: 'm' }),
            recompute: () => (0.5 * 0.06 * 20 ** 2) / (0.06 * 9.8),
            model: '20.4',
            points: [
              point(
                r`Uses gain in gravitational potential energy = loss of kinetic energy: $12 = 0.060 \times 9.8 \times h$`,
                {
                  allow: ['their answer to the first part in place of 12'],
                },
              ),
              r`Rearranges: $h = \dfrac{12}{0.060 \times 9.8}$`,
              point('20.4 (m)', { allow: ['20 (m)'] }),
            ],
          }),
        ],
        guidance:
          'Square the speed before multiplying. At the highest point all the kinetic energy has been transferred to the gravitational potential store.',
      }),
      short({
        stem: 'An electric motor is supplied with 500 J of energy. It transfers 340 J usefully.\n\nCalculate the efficiency of the motor. Give your answer as a percentage.',
        seconds: 70,
        lines: 3,
        answerLabel: 'Efficiency =',
        answer: num(68, { unit: '%' }),
        recompute: () => (340 / 500) * 100,
        model: '68',
        points: [
          r`Substitutes: $\text{efficiency} = \dfrac{340}{500}$`,
          point('68 (%)', { ignore: ['0.68 seen in the working'] }),
        ],
        guidance:
          'Useful energy out goes on top, total energy in goes underneath. Multiply by 100 because a percentage is asked for.',
      }),
      short({
        stem: r`A heater warms 2.0 kg of water from 15 °C to 65 °C.

Specific heat capacity of water $= 4200\ \text{J/kg}\,^\circ\text{C}$

Calculate the energy transferred to the water. Give your answer in kilojoules (kJ).`,
        seconds: 120,
        lines: 4,
        answerLabel: 'Energy =',
        answer: num(420, { unit: 'kJ' }),
        recompute: () => (2 * 4200 * (65 - 15)) / 1000,
        model: '420',
        points: [
          r`Temperature change $= 65 - 15 = 50\ {}^\circ\text{C}$`,
          r`Substitutes: $\Delta E = 2.0 \times 4200 \times 50$ (= 420 000 J)`,
          '420 (kJ)',
        ],
        guidance: r`$\Delta E = mc\Delta\theta$ gives joules. Divide by 1000 at the end for kilojoules, and use the temperature **change**, not the final temperature.`,
      }),
      short({
        stem: 'A crane does 5400 J of work in 12 s.\n\nCalculate the power output of the crane. Include the unit.',
        seconds: 90,
        lines: 3,
        answerLabel: 'Power =',
        answer: num(450, { unit: 'W', isUnitRequired: true }),
        recompute: () => 5400 / 12,
        model: '450 W',
        points: [
          r`Substitutes: $P = \dfrac{5400}{12}$`,
          '450',
          point('W', { allow: ['watt', 'watts', 'J/s', 'joules per second'] }),
        ],
      }),
      short({
        stem: 'A pendulum swings and slowly comes to rest.\n\nName the type of energy store, in the pendulum and the air around it, that has more energy at the end than at the start.',
        seconds: 35,
        answer: words(
          'thermal',
          'thermal store',
          'thermal energy',
          'thermal energy store',
          'internal',
          'internal energy',
          'internal store',
          'internal energy store',
          'heat',
          'heat energy',
          'heat store',
          'thermal/internal',
          'internal/thermal',
          'thermal/heat',
          'heat/thermal',
        ),
        model: 'thermal',
        points: [point('Thermal (store)', { allow: ['internal (energy)', 'heat'], reject: ['kinetic', 'sound'] })],
      }),
      recall({
        stem: 'A stretched elastic band is released and fires a small stone vertically upwards.\n\nDescribe the changes in energy stores from the moment of release until the stone reaches its highest point.',
        seconds: 170,
        lines: 7,
        points: [
          'Elastic potential energy of the band decreases',
          'Kinetic energy of the stone increases (as the band returns to its original length)',
          point('As the stone rises its kinetic energy decreases and its gravitational potential energy increases', {
            allow: ['kinetic is transferred to gravitational potential'],
          }),
          point('Some energy is transferred to the thermal store of the surroundings', {
            allow: ['energy is dissipated because of air resistance'],
            reject: ['energy is lost with no store named'],
          }),
        ],
        model:
          'The elastic potential energy of the band decreases and the kinetic energy of the stone increases. As the stone rises, its kinetic energy decreases and its gravitational potential energy increases. Air resistance means that some energy is transferred to the thermal store of the surroundings.',
        guidance:
          'Name each store and say whether it goes up or down. "Energy is lost" earns nothing unless you say where it goes.',
      }),
      recall({
        stem: 'A house has thick walls made of a material with a low thermal conductivity.\n\nExplain why less energy is needed to keep this house warm in winter than a house with thin walls of a high thermal conductivity.',
        seconds: 120,
        lines: 5,
        points: [
          point('Low thermal conductivity means a lower rate of energy transfer by conduction through the walls', {
            allow: ['energy is conducted more slowly'],
          }),
          'Greater thickness also lowers the rate of energy transfer',
          point(
            'So the house cools more slowly and less energy has to be supplied each second to keep its temperature the same',
            {
              allow: ['the heating has to be on for less time'],
              reject: ['no energy is transferred through the walls'],
            },
          ),
        ],
        model:
          'A low thermal conductivity means energy is conducted through the walls at a lower rate, and a greater thickness lowers the rate further. The house cools more slowly, so less energy has to be supplied each second to keep it at the same temperature.',
        guidance:
          'Two features are given, so explain the effect of each and then link them to the rate at which energy must be supplied.',
      }),
    ],
  },
  {
    number: '2',
    title: 'Electric circuits',
    weights: { 1: 24 },
    questions: [
      short({
        stem: 'There is a current of 0.40 A in a lamp for 2.0 minutes.\n\nCalculate the charge that flows through the lamp.',
        seconds: 100,
        lines: 3,
        answerLabel: 'Charge =',
        answer: num(48, { unit: 'C' }),
        recompute: () => 0.4 * 2 * 60,
        model: '48',
        points: ['Converts 2.0 minutes to 120 s', r`Substitutes: $Q = 0.40 \times 120$`, '48 (C)'],
        guidance: r`$Q = It$ needs time in seconds. An answer of 0.8 comes from leaving the time in minutes.`,
      }),
      short({
        stem: 'The potential difference across a resistor is 9.0 V. The current in it is 0.15 A.\n\nCalculate the resistance of the resistor.',
        seconds: 70,
        lines: 3,
        answerLabel: 'Resistance =',
        answer: num(60, { unit: 'Ω' }),
        recompute: () => 9 / 0.15,
        model: '60',
        points: [point(r`Rearranges: $R = \dfrac{9.0}{0.15}$`, { allow: ['9.0 = 0.15 × R'] }), r`60 ($\Omega$)`],
        guidance: r`Rearrange $V = IR$ before you substitute. Dividing the wrong way round gives a resistance much smaller than 1 ohm.`,
      }),
      shortParts({
        stem: r`A 12 V battery is connected in series with a $10\ \Omega$ resistor and a $30\ \Omega$ resistor.`,
        seconds: 180,
        parts: [
          part({
            prompt: 'Calculate the total resistance of the two resistors.',
            answerLabel: 'Total resistance =',
            answer: num(40, { unit: 'Ω' }),
            recompute: () => 10 + 30,
            model: '40',
            points: [r`40 ($\Omega$)`],
          }),
          part({
            prompt: 'Calculate the current in the circuit.',
            lines: 3,
            answerLabel: 'Current =',
            answer: num(0.3, { unit: 'A' }),
            recompute: () => 12 / (10 + 30),
            model: '0.30',
            points: [
              point(r`Substitutes: $I = \dfrac{12}{40}$`, { allow: ['their total resistance in place of 40'] }),
              '0.30 (A)',
            ],
          }),
          part({
            prompt: r`Calculate the potential difference across the $30\ \Omega$ resistor.`,
            lines: 3,
            answerLabel: 'Potential difference =',
            answer: num(9, { unit: 'V' }),
            recompute: () => (12 / (10 + 30)) * 30,
            model: '9.0',
            points: [
              point(r`Substitutes: $V = 0.30 \times 30$`, {
                allow: ['their current in place of 0.30', 'three quarters of 12 V'],
              }),
              '9.0 (V)',
            ],
          }),
        ],
        guidance:
          'In a series circuit the current is the same everywhere and the potential differences add up to that of the battery. The larger resistance takes the larger share.',
      }),
      short({
        stem: 'Name the component whose resistance decreases as the intensity of the light falling on it increases.',
        seconds: 30,
        answer: exactly(
          [
            'light-dependent resistor',
            'light dependent resistor',
            'LDR',
            'L.D.R.',
            'light-dependent resistor (LDR)',
            'light dependent resistor (LDR)',
            'photoresistor',
          ],
          ['LED', 'thermistor', 'diode'],
        ),
        model: 'light-dependent resistor',
        points: [point('Light-dependent resistor', { allow: ['LDR'], reject: ['LED', 'diode', 'thermistor'] })],
      }),
      short({
        stem: 'Two resistors are connected in parallel.\n\nState how their total resistance compares with the resistance of the smaller of the two resistors.',
        seconds: 45,
        lines: 2,
        answer: wording(
          'less than',
          'less',
          'less than the smaller',
          'it is less',
          'it is less than the smaller',
          'smaller',
          'it is smaller',
          'lower',
          'it is lower',
          'the total resistance is less than the resistance of the smaller resistor',
          'it is less than the resistance of the smaller resistor',
          'total resistance is less',
        ),
        model: 'It is less than the resistance of the smaller resistor',
        points: [
          point('Total resistance is less than that of the smaller resistor', {
            allow: ['smaller', 'lower'],
            reject: ['half'],
          }),
        ],
        guidance:
          'Adding a resistor in parallel gives the charge another path, so the total current rises for the same potential difference.',
      }),
      recall({
        stem: 'Explain, in terms of ions and electrons, why the resistance of a filament lamp increases as the current in it increases.',
        seconds: 120,
        lines: 6,
        points: [
          'Temperature of the filament increases',
          point('Ions in the metal vibrate more', {
            allow: ['atoms for ions', 'ions vibrate with a greater amplitude'],
            reject: ['ions start to vibrate'],
          }),
          point('So electrons collide with the ions more often', {
            allow: ['it is harder for electrons to pass through'],
          }),
        ],
        model:
          'A larger current raises the temperature of the filament. The ions in the metal vibrate more, so the electrons collide with the ions more often and it is harder for them to flow.',
      }),
      recall({
        stem: 'Describe how a student could investigate how the resistance of a wire depends on its length.',
        seconds: 330,
        lines: 12,
        points: [
          point('Ammeter connected in series with the wire and voltmeter connected in parallel across it', {
            allow: ['a correct circuit diagram'],
          }),
          'Measures the length of wire between the connections with a metre rule',
          'Records the current and the potential difference',
          r`Calculates resistance using $R = \dfrac{V}{I}$`,
          'Repeats for a range of at least five different lengths of the same wire',
          point(
            'Keeps the temperature of the wire constant, by using a small current or switching off between readings',
            {
              ignore: ['fair test'],
            },
          ),
        ],
        model:
          'Connect the wire in series with an ammeter and a power supply, with a voltmeter in parallel across the wire. Measure the length of wire between the crocodile clips with a metre rule. Record the current and the potential difference. Work out the resistance as potential difference divided by current. Move a clip and repeat for at least five lengths of the same wire, such as 20 cm to 100 cm. Use a small current and switch off between readings so that the temperature of the wire stays constant.',
        guidance:
          'Say what you measure, with what, what you change, and what you keep the same. "Make it a fair test" earns nothing.',
      }),
    ],
  },
  {
    number: '3',
    title: 'Electricity in the home',
    weights: { 1: 18 },
    questions: [
      shortParts({
        stem: 'The mains electricity supply in the United Kingdom is an alternating supply.',
        seconds: 60,
        parts: [
          part({
            prompt: 'State the frequency of the supply. Include the unit.',
            answerLabel: 'Frequency =',
            answer: num(50, { unit: 'Hz', isUnitRequired: true }),
            model: '50 Hz',
            points: [point('50 Hz', { allow: ['50 hertz'] })],
          }),
          part({
            prompt: 'State the potential difference of the supply. Include the unit.',
            answerLabel: 'Potential difference =',
            answer: num(230, { unit: 'V', isUnitRequired: true }),
            model: '230 V',
            points: [point('230 V', { allow: ['230 volts'] })],
          }),
        ],
      }),
      short({
        stem: 'State the colour of the insulation on the live wire in a three-core mains cable in the United Kingdom.',
        seconds: 30,
        answer: words('brown', 'brown wire', 'brown insulation'),
        model: 'Brown',
        points: [point('Brown', { reject: ['red', 'blue'] })],
      }),
      short({
        stem: 'A 2.3 kW heater is connected to the 230 V mains supply.\n\nCalculate the current in the heater.',
        seconds: 100,
        lines: 4,
        answerLabel: 'Current =',
        answer: num(10, { unit: 'A' }),
        recompute: () => 2300 / 230,
        model: '10',
        points: ['Converts 2.3 kW to 2300 W', r`Rearranges: $I = \dfrac{2300}{230}$`, '10 (A)'],
        guidance: r`Use $P = VI$ with the power in watts. A current of 0.01 A would be far too small for a heater, which is a sign that the kilo was missed.`,
      }),
      short({
        stem: r`There is a current of 2.0 A in a resistor of resistance $12\ \Omega$.

Calculate the power transferred by the resistor.`,
        seconds: 75,
        lines: 3,
        answerLabel: 'Power =',
        answer: num(48, { unit: 'W' }),
        recompute: () => 2 ** 2 * 12,
        model: '48',
        points: [r`Substitutes: $P = 2.0^2 \times 12$`, '48 (W)'],
        guidance: r`In $P = I^2R$ only the current is squared.`,
      }),
      short({
        stem: 'A microwave oven has a power of 800 W. It is used for 5.0 minutes.\n\nCalculate the energy transferred, in joules.',
        seconds: 100,
        lines: 3,
        answerLabel: 'Energy =',
        answer: num(240000, { unit: 'J' }),
        recompute: () => 800 * 5 * 60,
        model: '240000',
        points: [
          'Converts 5.0 minutes to 300 s',
          r`Substitutes: $E = 800 \times 300$`,
          point('240 000 (J)', { allow: ['2.4 × 10⁵ (J)'] }),
        ],
      }),
      recall({
        stem: 'The live wire inside a toaster comes loose and touches the metal case. The case is earthed and the plug contains a fuse.\n\nExplain how the earth wire and the fuse make the toaster safe.',
        seconds: 160,
        lines: 7,
        points: [
          point('The earth wire gives a path of low resistance from the case to earth', {
            ignore: ['it earths the toaster'],
          }),
          point('So a large current flows', { allow: ['a surge of current'] }),
          point('The fuse wire melts', { allow: ['the fuse blows'], reject: ['the fuse explodes'] }),
          point('This breaks the circuit, disconnecting the live supply from the case', {
            allow: ['the case is no longer live'],
            ignore: ['so nobody gets a shock'],
          }),
        ],
        model:
          'The earth wire gives a low-resistance path from the case to earth, so a large current flows through the live wire, the fuse and the earth wire. The large current melts the fuse wire. This breaks the circuit and disconnects the case from the live supply.',
        guidance: 'Write the steps in order: low resistance, large current, fuse melts, circuit broken.',
      }),
      recall({
        stem: 'Explain why the National Grid transmits electrical power at a very high potential difference.',
        seconds: 120,
        lines: 6,
        points: [
          point('For the same power, a higher potential difference means a smaller current', {
            reject: ['smaller resistance'],
          }),
          point('A smaller current means less heating of the cables', {
            allow: ['the power dissipated is I²R, so it falls'],
          }),
          point('So less energy is wasted and transmission is more efficient', { reject: ['no energy is wasted'] }),
        ],
        model:
          'For the same power, a higher potential difference means a smaller current in the cables. A smaller current heats the cables less, so less energy is wasted to the surroundings and the transmission is more efficient.',
        guidance:
          'Link three steps: smaller current, less heating, less energy wasted. Cables do not lose their resistance.',
      }),
    ],
  },
];
