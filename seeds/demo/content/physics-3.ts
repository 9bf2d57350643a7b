import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 2: waves, magnetism and space. */
export const wavesMagnetismAndSpace: TopicContent[] = [
  {
    number: '8',
    title: 'Waves and the electromagnetic spectrum',
    weights: { 2: 24 },
    questions: [
      short({
        stem: 'A sound wave has a frequency of 680 Hz and a wavelength of 0.50 m.\n\nCalculate the speed of the wave.',
        seconds: 70,
        lines: 3,
        answerLabel: 'Speed =',
        answer: num(340, { unit: 'm/s' }),
        recompute: () => 680 * 0.5,
        model: '340',
        points: [r`Substitutes: $v = 680 \times 0.50$`, '340 (m/s)'],
      }),
      short({
        stem: 'The period of a wave is 0.020 s.\n\nCalculate the frequency of the wave. Include the unit.',
        seconds: 80,
        lines: 3,
        answerLabel: 'Frequency =',
        answer: num(50, { unit: 'Hz', isUnitRequired: true }),
        recompute: () => 1 / 0.02,
        model: '50 Hz',
        points: [r`Substitutes: $f = \dfrac{1}{0.020}$`, '50', point('Hz', { allow: ['hertz', 'per second'] })],
        guidance: 'Frequency is the number of waves each second, so it is 1 divided by the period.',
      }),
      shortParts({
        stem: 'The electromagnetic spectrum is divided into seven types of wave.',
        seconds: 100,
        parts: [
          part({
            prompt: 'Name the type of wave with the longest wavelength.',
            answer: words('radio waves', 'radio wave', 'radio'),
            model: 'Radio waves',
            points: [point('Radio (waves)', { reject: ['sound', 'microwaves'] })],
          }),
          part({
            prompt: 'Name the type of wave with wavelengths between those of visible light and X-rays.',
            answer: words(
              'ultraviolet',
              'ultraviolet radiation',
              'ultraviolet light',
              'ultraviolet waves',
              'ultraviolet rays',
              'ultra-violet',
              'ultra violet',
              'UV',
              'UV radiation',
              'UV light',
              'UV rays',
              'UV waves',
            ),
            model: 'Ultraviolet',
            points: [point('Ultraviolet', { allow: ['UV'], reject: ['infrared', 'violet'] })],
          }),
          part({
            prompt: 'Name the type of wave with the highest frequency.',
            answer: words(
              'gamma rays',
              'gamma ray',
              'gamma',
              'gamma radiation',
              'gamma waves',
              'gamma wave',
              'γ',
              'γ rays',
            ),
            model: 'Gamma rays',
            points: [point('Gamma (rays)', { reject: ['X-rays'] })],
          }),
        ],
      }),
      short({
        stem: r`A radio station broadcasts on a wavelength of 3.0 m.

Speed of electromagnetic waves $= 3.0 \times 10^8\ \text{m/s}$

Calculate the frequency of the waves. Give your answer in megahertz (MHz).`,
        seconds: 110,
        lines: 4,
        answerLabel: 'Frequency =',
        answer: num(100, { unit: 'MHz' }),
        recompute: () => 3e8 / 3 / 1e6,
        model: '100',
        points: [
          r`Rearranges: $f = \dfrac{3.0 \times 10^8}{3.0}$`,
          r`$1.0 \times 10^8$ (Hz)`,
          point('100 (MHz)', { allow: ['their frequency in hertz correctly divided by 10⁶'] }),
        ],
        guidance: r`$1\ \text{MHz} = 10^6\ \text{Hz}$, so divide a frequency in hertz by $10^6$.`,
      }),
      short({
        stem: 'State the type of electromagnetic wave used both to send television pictures by satellite and to cook food.',
        seconds: 35,
        answer: words('microwaves', 'microwave', 'microwave radiation', 'micro waves', 'micro-waves'),
        model: 'Microwaves',
        points: [point('Microwaves', { reject: ['radio waves', 'infrared'] })],
      }),
      short({
        stem: 'State what is meant by the **amplitude** of a wave.',
        seconds: 50,
        lines: 2,
        answer: wording(
          'the maximum displacement of a point on the wave from its undisturbed position',
          'the maximum displacement from the undisturbed position',
          'the maximum displacement from the equilibrium position',
          'the maximum displacement from the rest position',
          'maximum displacement',
          'the greatest displacement from the rest position',
          'the greatest displacement from the undisturbed position',
          'the height of a crest above the undisturbed position',
        ),
        model: 'the maximum displacement of a point on the wave from its undisturbed position',
        points: [
          point('Maximum displacement of a point on the wave from its undisturbed position', {
            allow: ['height of a crest above, or depth of a trough below, the rest position'],
            reject: ['height of the wave from trough to crest'],
          }),
        ],
      }),
      recall({
        stem: 'Compare transverse waves and longitudinal waves. Give **one** example of each.',
        seconds: 150,
        lines: 7,
        points: [
          point('In a transverse wave the oscillations are perpendicular to the direction of energy transfer', {
            allow: ['at right angles to the direction the wave travels'],
            ignore: ['up and down'],
          }),
          point('In a longitudinal wave the oscillations are parallel to the direction of energy transfer', {
            allow: ['along the direction the wave travels'],
            ignore: ['side to side'],
          }),
          point('Example of a transverse wave: light', {
            allow: ['any electromagnetic wave', 'ripples on water', 'a wave on a string', 'S-waves'],
          }),
          point('Example of a longitudinal wave: sound', {
            allow: ['ultrasound', 'P-waves', 'a push–pull wave along a spring'],
          }),
        ],
        model:
          'In a transverse wave, such as light, the oscillations are perpendicular to the direction of energy transfer. In a longitudinal wave, such as sound, the oscillations are parallel to the direction of energy transfer.',
        guidance:
          '"Up and down" and "side to side" earn nothing. Compare the oscillation with the direction of energy transfer.',
      }),
      recall({
        stem: 'Describe how the speed of water waves in a ripple tank could be measured.',
        seconds: 180,
        lines: 8,
        points: [
          point('Measure the length of several waves and divide by the number of waves to find the wavelength', {
            allow: ['a photograph, or a strobe light, used to freeze the waves'],
          }),
          'Use a ruler in the tank, or placed on the screen with the scale allowed for',
          point('Count the waves that pass a point in a measured time and divide by the time to find the frequency', {
            allow: ['read the frequency from the signal generator or strobe'],
          }),
          r`Calculate speed $= \text{frequency} \times \text{wavelength}$`,
        ],
        model:
          'Take a photograph of the waves with a ruler in view. Measure the length of ten waves and divide by ten to find the wavelength. Count the waves that pass a point in ten seconds and divide by ten to find the frequency. Multiply the frequency by the wavelength to get the speed.',
      }),
      recall({
        stem: 'A plane wave crosses a boundary, at an angle, from deep water into shallow water, where it travels more slowly.\n\nExplain, in terms of wave fronts, why the wave changes direction.',
        tier: 'higher',
        seconds: 130,
        lines: 6,
        points: [
          point('One end of each wave front reaches the shallow water before the other', {
            allow: ['part of the wave front crosses first'],
          }),
          'That part slows down while the rest is still moving at the higher speed',
          point('So the wave front turns, and the wave bends towards the normal', {
            reject: ['bends away from the normal'],
          }),
        ],
        model:
          'One end of each wave front reaches the shallow water first and slows down, while the rest of the wave front is still in deep water and moving faster. This turns the wave front, so the wave changes direction towards the normal.',
      }),
      recall({
        stem: 'Gamma rays can cause cancer, but they are also used in hospitals to treat it.\n\nExplain how gamma rays can cause cancer and how they can be used to treat it.',
        seconds: 130,
        lines: 6,
        points: [
          point('Gamma rays are ionising', { allow: ['they remove electrons from atoms'] }),
          point('They can damage or change DNA, causing mutations (so cells divide without control)', {
            allow: ['mutate genes'],
          }),
          point('A beam or source directed at a tumour kills the cancer cells', {
            allow: ['radiotherapy destroys tumour cells'],
          }),
        ],
        model:
          'Gamma rays are ionising. They can damage the DNA in cells and cause mutations, so that the cells divide without control. In treatment, beams of gamma rays are directed at a tumour so that they kill the cancer cells.',
      }),
    ],
  },
  {
    number: '9',
    title: 'Magnetism and electromagnetism',
    weights: { 2: 20 },
    questions: [
      short({
        stem: 'Name **one** metal element that is magnetic at room temperature.',
        seconds: 30,
        answer: words('iron', 'nickel', 'cobalt', 'gadolinium', 'Fe', 'Ni', 'Co'),
        model: 'Iron',
        points: [
          point('Iron', {
            allow: ['nickel', 'cobalt', 'gadolinium'],
            reject: ['steel, which is an alloy', 'aluminium', 'copper'],
          }),
        ],
      }),
      short({
        stem: 'An iron nail becomes a magnet when it is placed near one pole of a bar magnet. It loses most of its magnetism when it is taken away.\n\nName this type of magnet.',
        seconds: 40,
        answer: words(
          'induced magnet',
          'induced',
          'an induced magnet',
          'temporary magnet',
          'temporary',
          'induced magnetism',
          'temporary induced magnet',
        ),
        model: 'Induced magnet',
        points: [point('Induced (magnet)', { allow: ['temporary (magnet)'], reject: ['permanent', 'electromagnet'] })],
        guidance: 'An induced magnet is always attracted to the magnet that induced it, never repelled.',
      }),
      short({
        stem: 'State the direction of the magnetic field lines outside a bar magnet.',
        seconds: 45,
        lines: 2,
        answer: wording(
          'from north to south',
          'north to south',
          'N to S',
          'from N to S',
          'from the north pole to the south pole',
          'north pole to south pole',
          'they go from north to south',
          'they point from the north pole to the south pole',
          'from the north pole of the magnet to the south pole of the magnet',
          'away from the north pole and towards the south pole',
          'from north-seeking pole to south-seeking pole',
        ),
        model: 'from the north pole to the south pole',
        points: [
          point('From the north (seeking) pole to the south (seeking) pole', {
            reject: ['from south to north', 'from positive to negative'],
          }),
        ],
      }),
      short({
        stem: r`A wire 0.50 m long carries a current of 3.0 A at right angles to a magnetic field of flux density $0.20\ \text{T}$.

Calculate the force on the wire.`,
        tier: 'higher',
        seconds: 80,
        lines: 3,
        answerLabel: 'Force =',
        answer: num(0.3, { unit: 'N' }),
        recompute: () => 0.2 * 3 * 0.5,
        model: '0.30',
        points: [r`Substitutes: $F = 0.20 \times 3.0 \times 0.50$`, '0.30 (N)'],
      }),
      short({
        stem: 'A transformer is 100% efficient. The potential difference across its primary coil is 230 V and the current in its primary coil is 0.50 A. The potential difference across its secondary coil is 23 V.\n\nCalculate the current in the secondary coil.',
        tier: 'higher',
        seconds: 110,
        lines: 4,
        answerLabel: 'Current =',
        answer: num(5, { unit: 'A' }),
        recompute: () => (230 * 0.5) / 23,
        model: '5.0',
        points: [
          r`Uses equal powers: $230 \times 0.50 = 23 \times I_\text{s}$`,
          r`Rearranges: $I_\text{s} = \dfrac{230 \times 0.50}{23}$`,
          '5.0 (A)',
        ],
        guidance: 'Equal powers mean that when the potential difference falls to a tenth, the current rises ten times.',
      }),
      recall({
        stem: 'A solenoid is a long coil of wire carrying a current.\n\nState **three** changes that would make the magnetic field of the solenoid stronger.',
        seconds: 90,
        lines: 4,
        points: [
          point('Increase the current', {
            allow: ['increase the potential difference across the coil'],
            ignore: ['more electricity'],
          }),
          point('Put an iron core inside the coil', {
            allow: ['a steel core'],
            ignore: ['a metal core', 'a magnet inside the coil'],
          }),
          point('Use more turns on the same length of coil', {
            allow: ['turns closer together'],
            ignore: ['a bigger coil'],
          }),
        ],
        model:
          'Increase the current in the wire, put an iron core inside the coil, and use more turns of wire in the same length.',
      }),
      recall({
        stem: 'Describe how to use a plotting compass to draw one magnetic field line of a bar magnet.',
        seconds: 160,
        lines: 8,
        points: [
          'Put the magnet on paper and the compass near its north pole',
          point('Mark a dot at the end of the compass needle that points away from the magnet', {
            allow: ['mark the direction of the needle with a dot at each end'],
          }),
          point(
            'Move the compass so that the tail of the needle is on the dot, and repeat until the south pole is reached',
            {
              allow: ['repeat until the compass reaches the magnet again, or the edge of the paper'],
            },
          ),
          point('Join the dots, with an arrow from north to south', {
            allow: ['arrow in the direction of the needle'],
          }),
        ],
        model:
          'Put the magnet on a sheet of paper and the compass near the north pole. Mark a dot where the needle points. Move the compass so that the tail of the needle is at this dot, mark a new dot at the other end, and repeat until you reach the south pole. Join the dots with a smooth line and add an arrow from north to south.',
      }),
      recall({
        stem: 'A simple d.c. motor has a coil in a magnetic field and a split-ring commutator.\n\nExplain why the coil keeps turning in one direction when there is a current in it.',
        tier: 'higher',
        seconds: 180,
        lines: 8,
        points: [
          point('Each side of the coil carries a current in a magnetic field and so experiences a force', {
            allow: ['the motor effect'],
          }),
          point(
            'The forces on the two sides are in opposite directions, because the currents are in opposite directions',
            {
              allow: ['one side is pushed up and the other down'],
            },
          ),
          point('So the coil turns', { allow: ['there is a turning effect', 'there is a moment'] }),
          point(
            'Every half turn the commutator reverses the current in the coil, so the turning effect stays in the same direction',
            {
              reject: ['the commutator reverses the magnetic field'],
            },
          ),
        ],
        model:
          'Each side of the coil carries a current in a magnetic field, so a force acts on it. The current in one side is opposite to that in the other, so the forces are in opposite directions and turn the coil. Every half turn the split-ring commutator reverses the current in the coil, so the turning effect is always in the same direction.',
        guidance:
          'Three ideas are needed: the force, why the two sides are pushed opposite ways, and what the commutator does every half turn.',
      }),
    ],
  },
  {
    number: '10',
    title: 'Space physics',
    weights: { 2: 16 },
    isSeparateOnly: true,
    questions: [
      short({
        stem: 'Name the galaxy that contains our Solar System.',
        seconds: 30,
        answer: words('Milky Way', 'Milky Way galaxy', 'Milkyway'),
        model: 'The Milky Way',
        points: [point('Milky Way', { reject: ['Andromeda', 'Universe'] })],
      }),
      shortParts({
        stem: 'Energy is released in the core of the Sun when hydrogen nuclei join together.',
        seconds: 60,
        parts: [
          part({
            prompt: 'Name the process.',
            answer: exactly(
              ['nuclear fusion', 'fusion', 'hydrogen fusion', 'fusion of hydrogen', 'thermonuclear fusion'],
              ['fission', 'nuclear fission'],
            ),
            model: 'Nuclear fusion',
            points: [point('(Nuclear) fusion', { reject: ['fission', 'burning', 'combustion'] })],
          }),
          part({
            prompt: 'Name the element that is produced.',
            answer: words('helium', 'He', 'helium-4'),
            model: 'Helium',
            points: ['Helium'],
          }),
        ],
      }),
      short({
        stem: 'A satellite moves in a circular orbit of radius 7000 km. It takes 5800 s to complete one orbit.\n\nCalculate its orbital speed in kilometres per second (km/s).',
        seconds: 130,
        lines: 4,
        answerLabel: 'Speed =',
        answer: num(7.6, { range: { min: 7.55, max: 7.6 }, unit: 'km/s' }),
        recompute: () => (2 * Math.PI * 7000) / 5800,
        model: '7.6',
        points: [
          r`Circumference $= 2 \times \pi \times 7000$ (= 43 982 km)`,
          point(r`Divides by the time: $\dfrac{43\,982}{5800}$`, { allow: ['their circumference in place of 43 982'] }),
          point('7.6 (km/s)', { allow: ['7.58 (km/s)'] }),
        ],
        guidance: r`Speed is distance divided by time, and the distance for one orbit is $2\pi r$.`,
      }),
      short({
        stem: 'Name the type of star that the Sun will become when it leaves the main sequence.',
        seconds: 35,
        answer: words('red giant', 'a red giant', 'red giant star', 'red-giant'),
        model: 'Red giant',
        points: [point('Red giant', { reject: ['red supergiant', 'white dwarf', 'supernova'] })],
      }),
      short({
        stem: 'A galaxy is moving away from the Earth.\n\nState what happens to the wavelength of the light we receive from it because of this movement.',
        seconds: 45,
        lines: 2,
        answer: wording(
          'it increases',
          'increases',
          'the wavelength increases',
          'it becomes longer',
          'it gets longer',
          'longer',
          'it is longer',
          'it is increased',
          'the wavelength is increased',
          'the wavelength becomes longer',
          'the wavelength gets longer',
          'it is stretched',
          'increase',
        ),
        model: 'The wavelength increases',
        points: [
          point('Wavelength increases', {
            allow: ['light is shifted towards the red end of the spectrum'],
            reject: ['wavelength decreases', 'the light turns red'],
          }),
        ],
        guidance: 'Longer wavelengths are towards the red end of the spectrum, which is why this is called red-shift.',
      }),
      recall({
        stem: 'Describe the life cycle of a star with about the same mass as the Sun, from the cloud it forms from to the end of its life.',
        seconds: 220,
        lines: 9,
        points: [
          point('A cloud of gas and dust (a nebula) is pulled together by gravity', { allow: ['a protostar forms'] }),
          point('It becomes hot enough for nuclear fusion to start', { allow: ['hydrogen fuses to helium'] }),
          'It becomes a main sequence star',
          'It expands to become a red giant',
          point('It shrinks to become a white dwarf (and cools to become a black dwarf)', {
            reject: ['supernova', 'neutron star', 'black hole'],
          }),
        ],
        model:
          'A cloud of gas and dust, a nebula, is pulled together by gravity to form a protostar. It becomes hot enough for hydrogen nuclei to fuse, and it becomes a main sequence star. When its hydrogen runs low it expands into a red giant. It then shrinks to a white dwarf, which cools to become a black dwarf.',
        guidance:
          'Supernova, neutron star and black hole belong to the life cycle of stars far more massive than the Sun, and lose the last mark here.',
      }),
      recall({
        stem: 'Explain why a star stays the same size while it is on the main sequence.',
        seconds: 110,
        lines: 5,
        points: [
          point('Gravity pulls the star inwards', { allow: ['gravitational force tends to collapse the star'] }),
          point('Fusion produces an outward pressure', {
            allow: ['energy from fusion tends to expand the star', 'radiation pressure acts outwards'],
          }),
          point('These are balanced', { allow: ['in equilibrium'] }),
        ],
        model:
          'Gravity tends to pull the star inwards, and the energy released by fusion produces an outward pressure that tends to expand it. The two are balanced, so the star stays the same size.',
      }),
      recall({
        stem: 'Explain how the red-shift of light from distant galaxies supports the Big Bang theory.',
        seconds: 170,
        lines: 8,
        points: [
          point('Red-shift shows that galaxies are moving away from us', {
            allow: ['receding'],
            reject: ['stars in our own galaxy'],
          }),
          point('Light from more distant galaxies has a greater red-shift', {
            allow: ['more distant galaxies are moving away faster'],
          }),
          'So the Universe is expanding',
          point(
            'So in the past everything was much closer together, and the Universe began from a very small, hot, dense region',
            {
              allow: ['the Universe started from one very small, very dense point'],
              reject: ['an explosion of a star'],
            },
          ),
        ],
        model:
          'Light from distant galaxies is red-shifted, which shows that they are moving away from us. The further away a galaxy is, the greater its red-shift and the faster it is moving away. This shows that the Universe is expanding, so in the past it was much smaller, and it began from a very small region that was extremely hot and dense.',
        guidance:
          'Go from the observation to the expansion, and from the expansion back to the beginning. Stopping at "galaxies are moving away" earns one mark.',
      }),
      recall({
        stem: 'A satellite moves in a circular orbit at constant speed.\n\nExplain why its velocity is changing, and name the force that causes the change.',
        tier: 'higher',
        seconds: 110,
        lines: 5,
        points: [
          'Velocity has direction as well as size',
          point('The direction of the motion is always changing', {
            allow: ['the direction changes all the time as it goes round'],
          }),
          point('Gravity, acting towards the centre of the orbit', {
            allow: ['the gravitational force of the planet'],
            ignore: ['centripetal force with no mention of gravity'],
          }),
        ],
        model:
          'Velocity is a vector, so it has direction as well as size. The direction of the satellite’s motion is always changing, so its velocity changes although its speed does not. The force is gravity, which acts towards the centre of the orbit.',
      }),
    ],
  },
];
