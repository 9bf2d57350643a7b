import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const carbonDioxide = ['carbon dioxide', 'CO2', 'CO₂'];

/** Paper 1: titration, chemical changes and energy changes. */
export const chemistryTopics4To6: TopicContent[] = [
  {
    number: '4',
    title: 'Titration, yield and gas volumes',
    weights: { 1: 12 },
    isSeparateOnly: true,
    questions: [
      short({
        seconds: 70,
        stem: r`The maximum theoretical mass of a salt in a preparation is $12.5\ \text{g}$. A student obtains $9.0\ \text{g}$. Calculate the percentage yield.`,
        lines: 2,
        answerLabel: 'Percentage yield =',
        answer: num(72, { unit: '%' }),
        recompute: () => (9.0 / 12.5) * 100,
        model: '72',
        points: [r`$\dfrac{9.0}{12.5} \times 100$`, r`$72\ (\%)$`],
      }),
      short({
        seconds: 120,
        stem: r`Hydrogen is made from methane and steam.

$$
\text{CH}_4 + \text{H}_2\text{O} \rightarrow \text{CO} + 3\text{H}_2
$$

Calculate the percentage atom economy for making hydrogen by this reaction. Give your answer to 3 significant figures.

Relative formula masses ($M_\text{r}$): $\text{CH}_4 = 16$, $\text{H}_2\text{O} = 18$, $\text{CO} = 28$, $\text{H}_2 = 2$`,
        lines: 4,
        answerLabel: 'Atom economy =',
        answer: num(17.6, { tolerance: 0.05, unit: '%' }),
        recompute: () => ((3 * 2) / (16 + 18)) * 100,
        model: '17.6',
        points: [
          r`Total $M_\text{r}$ of reactants $= 16 + 18 = 34$`,
          r`$\dfrac{3 \times 2}{34} \times 100$`,
          r`$17.6\ (\%)$`,
        ],
        guidance: 'The 3 in front of hydrogen counts: the useful product has a total mass of 6. Using 2 gives 5.88%.',
      }),
      short({
        seconds: 110,
        tier: 'higher',
        stem: r`A solution contains $8.0\ \text{g}$ of sodium hydroxide, $\text{NaOH}$, in $500\ \text{cm}^3$. Calculate the concentration of the solution in $\text{mol/dm}^3$.

Relative formula mass ($M_\text{r}$): $\text{NaOH} = 40$`,
        lines: 4,
        answerLabel: 'Concentration =',
        answer: num(0.4, { unit: 'mol/dm³' }),
        recompute: () => 8.0 / 40 / (500 / 1000),
        model: '0.40',
        points: [
          point(r`Moles of $\text{NaOH} = \dfrac{8.0}{40} = 0.20$`, { allow: ['concentration = 16 g/dm³'] }),
          r`$\dfrac{0.20}{0.500}$`,
          r`$0.40\ (\text{mol/dm}^3)$`,
        ],
      }),
      short({
        seconds: 180,
        tier: 'higher',
        stem: r`In a titration, $25.0\ \text{cm}^3$ of sodium hydroxide solution is neutralised by $20.0\ \text{cm}^3$ of sulfuric acid of concentration $0.150\ \text{mol/dm}^3$.

$$
2\text{NaOH} + \text{H}_2\text{SO}_4 \rightarrow \text{Na}_2\text{SO}_4 + 2\text{H}_2\text{O}
$$

Calculate the concentration of the sodium hydroxide solution in $\text{mol/dm}^3$.`,
        lines: 5,
        answerLabel: 'Concentration =',
        answer: num(0.24, { unit: 'mol/dm³' }),
        recompute: () => ((20.0 / 1000) * 0.15 * 2) / (25.0 / 1000),
        model: '0.240',
        points: [
          r`Moles of $\text{H}_2\text{SO}_4 = \dfrac{20.0}{1000} \times 0.150 = 0.00300$`,
          r`Moles of $\text{NaOH} = 2 \times 0.00300 = 0.00600$`,
          r`$\dfrac{0.00600}{0.0250}$`,
          r`$0.240\ (\text{mol/dm}^3)$`,
        ],
        guidance:
          'Start from the solution whose volume and concentration are both known. Two moles of sodium hydroxide react with one of sulfuric acid, so double before dividing.',
      }),
      short({
        seconds: 120,
        tier: 'higher',
        stem: r`Calcium carbonate reacts with excess hydrochloric acid.

$$
\text{CaCO}_3 + 2\text{HCl} \rightarrow \text{CaCl}_2 + \text{H}_2\text{O} + \text{CO}_2
$$

Calculate the volume of carbon dioxide, at room temperature and pressure, made from $2.50\ \text{g}$ of calcium carbonate.

One mole of any gas occupies $24.0\ \text{dm}^3$ at room temperature and pressure.

Relative formula mass ($M_\text{r}$): $\text{CaCO}_3 = 100$`,
        lines: 4,
        answerLabel: 'Volume =',
        answer: num(0.6, { unit: 'dm³' }),
        recompute: () => (2.5 / 100) * 24,
        model: '0.600',
        points: [
          r`Moles of $\text{CaCO}_3 = \dfrac{2.50}{100} = 0.0250$`,
          r`Moles of $\text{CO}_2 = 0.0250$, so $0.0250 \times 24.0$`,
          r`$0.600\ (\text{dm}^3)$`,
        ],
      }),
      short({
        seconds: 90,
        stem: r`A student records these titres.

- Trial: $24.60\ \text{cm}^3$
- 1st: $23.95\ \text{cm}^3$
- 2nd: $24.40\ \text{cm}^3$
- 3rd: $24.05\ \text{cm}^3$

Titres within $0.10\ \text{cm}^3$ of each other are concordant. Calculate the mean titre, using concordant results only.`,
        lines: 3,
        answerLabel: 'Mean titre =',
        answer: num(24, { unit: 'cm³' }),
        recompute: () => (23.95 + 24.05) / 2,
        model: '24.00',
        points: [r`Uses $23.95$ and $24.05$ only`, r`$24.00\ (\text{cm}^3)$`],
        guidance:
          'Only two of the results agree to within 0.10. The trial and any other titre that does not agree are left out.',
      }),
      recall({
        seconds: 270,
        stem: r`Describe how a student can use titration to find the volume of dilute hydrochloric acid that exactly neutralises $25.0\ \text{cm}^3$ of sodium hydroxide solution.`,
        lines: 12,
        points: [
          point(r`Use a pipette to put $25.0\ \text{cm}^3$ of sodium hydroxide solution into a conical flask`, {
            reject: ['measuring cylinder'],
          }),
          point('Add a few drops of a suitable indicator, such as phenolphthalein or methyl orange', {
            allow: ['litmus'],
            reject: ['universal indicator'],
          }),
          point('Fill a burette with the acid and record the starting reading'),
          point('Add the acid a little at a time while swirling, drop by drop near the end point'),
          point('Stop when the indicator changes colour, read the burette and subtract to find the volume added', {
            allow: ['a correct colour change, such as pink to colourless for phenolphthalein'],
          }),
          point('Repeat until results are concordant and find their mean', {
            allow: ['repeat and calculate a mean'],
          }),
        ],
        model: r`Use a pipette to put $25.0\ \text{cm}^3$ of sodium hydroxide solution into a conical flask on a white tile. Add a few drops of phenolphthalein. Fill a burette with the acid and record the reading. Add the acid while swirling, drop by drop near the end. Stop when the pink colour just disappears and read the burette again; the difference is the volume of acid. Repeat until two results are within $0.10\ \text{cm}^3$ and find the mean.`,
        guidance:
          'Name the apparatus that measures each volume. The swirling, the drop-by-drop addition and the repeats are separate creditable steps.',
      }),
      recall({
        seconds: 100,
        stem: 'Give three reasons why the mass of product obtained in a reaction is usually less than the maximum theoretical mass.',
        lines: 4,
        points: [
          point('The reaction may not go to completion, for example because it is reversible'),
          point('Some product may be lost when it is separated from the reaction mixture', {
            allow: ['lost during filtering or transfer between containers'],
            reject: ['the product escapes, with no reason given'],
          }),
          point('Some reactants may react in other ways than expected', {
            allow: ['side reactions', 'impure reactants'],
          }),
        ],
        model:
          'The reaction may be reversible and so not go to completion. Some product may be lost when it is filtered or transferred. Some of the reactants may react in a different way from the expected reaction.',
      }),
    ],
  },
  {
    number: '5',
    title: 'Chemical changes',
    weights: { 1: 18 },
    questions: [
      shortParts({
        seconds: 75,
        stem: 'Zinc carbonate reacts with dilute sulfuric acid. Three products are formed, one of which is water.',
        parts: [
          part({
            prompt: 'Name the salt formed.',
            answer: exactly(
              ['zinc sulfate', 'zinc sulphate', 'ZnSO4'],
              ['zinc sulfide', 'zinc sulphide', 'zinc sulfite', 'zinc sulphite'],
            ),
            model: 'zinc sulfate',
            points: [point('zinc sulfate', { allow: ['ZnSO₄'], reject: ['zinc sulfide'] })],
          }),
          part({
            prompt: 'Name the gas formed.',
            answer: words(...carbonDioxide, 'carbon dioxide gas'),
            model: 'carbon dioxide',
            points: [point('carbon dioxide', { allow: ['CO₂'], reject: ['hydrogen'] })],
          }),
        ],
        guidance: 'Sulfuric acid makes sulfates. An acid and a carbonate give a salt, water and carbon dioxide.',
      }),
      shortParts({
        seconds: 110,
        stem: 'Concentrated sodium chloride solution is electrolysed using inert electrodes.',
        guidance:
          'Sodium is more reactive than hydrogen, so hydrogen is released at the negative electrode. Sodium ions and hydroxide ions are left in the solution.',
        parts: [
          part({
            prompt: 'Name the gas produced at the negative electrode.',
            answer: words('hydrogen', 'H2', 'H₂', 'hydrogen gas'),
            model: 'hydrogen',
            points: [point('hydrogen', { allow: ['H₂'], reject: ['sodium'] })],
          }),
          part({
            prompt: 'Name the gas produced at the positive electrode.',
            answer: exactly(['chlorine', 'Cl2', 'chlorine gas'], ['chloride', 'chloride gas']),
            model: 'chlorine',
            points: [point('chlorine', { allow: ['Cl₂'], reject: ['chloride', 'oxygen'] })],
          }),
          part({
            prompt: 'Name the alkali that forms in the solution.',
            answer: words('sodium hydroxide', 'NaOH', 'sodium hydroxide solution', 'caustic soda'),
            model: 'sodium hydroxide',
            points: [point('sodium hydroxide', { allow: ['NaOH'] })],
          }),
        ],
      }),
      recall({
        seconds: 80,
        stem: 'Lead bromide can be electrolysed when it is molten but not when it is solid. Explain why.',
        lines: 4,
        points: [
          point('In the solid the ions are held in fixed positions and cannot move', {
            reject: ['electrons cannot move'],
          }),
          point('In the molten compound the ions are free to move to the electrodes and carry charge', {
            allow: ['ions carry the current'],
            reject: ['free electrons carry the charge'],
          }),
        ],
        model:
          'In solid lead bromide the ions are held in fixed positions in the lattice. When it is molten the ions are free to move, so they can carry charge to the electrodes.',
        guidance: 'The charge in an electrolyte is carried by ions. Writing "electrons" loses the mark.',
      }),
      shortParts({
        seconds: 80,
        tier: 'higher',
        stem: r`At the negative electrode in the extraction of aluminium, this change takes place.

$$
\text{Al}^{3+} + x\text{e}^- \rightarrow \text{Al}
$$`,
        parts: [
          part({
            prompt: r`Give the value of $x$.`,
            answer: num(3),
            answerLabel: 'x =',
            model: '3',
            points: ['3'],
          }),
          part({
            prompt: 'State why this change is described as reduction.',
            answer: wording(
              'electrons are gained',
              'electrons gained',
              'gain of electrons',
              'gains electrons',
              'it gains electrons',
              'aluminium ions gain electrons',
              'aluminium ion gains electrons',
              'ions gain electrons',
              'because electrons are gained',
              'it gains 3 electrons',
              'it gains three electrons',
              'aluminium ions gain three electrons',
              'Al3+ gains electrons',
              'reduction is gain of electrons',
            ),
            model: 'aluminium ions gain electrons',
            points: [
              point('Electrons are gained (by the aluminium ions)', { reject: ['oxygen is lost', 'loses electrons'] }),
            ],
          }),
        ],
      }),
      recall({
        seconds: 270,
        stem: 'Describe how to make pure, dry crystals of copper sulfate from copper oxide, which is insoluble, and dilute sulfuric acid.',
        lines: 12,
        points: [
          point('Warm the dilute sulfuric acid', { allow: ['heat the mixture'] }),
          point('Add copper oxide, stirring, until it is in excess', {
            allow: ['until no more reacts', 'until some black solid is left'],
          }),
          point('Filter to remove the excess copper oxide'),
          point('Heat the filtrate to evaporate some of the water', {
            allow: ['heat to the point of crystallisation', 'use a water bath'],
          }),
          point('Leave the solution to cool so that crystals form', { reject: ['evaporate to dryness'] }),
          point('Remove the crystals and dry them between filter papers', { allow: ['leave in a warm place to dry'] }),
        ],
        model:
          'Warm the dilute sulfuric acid. Add copper oxide a little at a time, stirring, until some is left unreacted. Filter to remove the excess copper oxide. Heat the filtrate in an evaporating basin to evaporate some of the water. Leave it to cool so that crystals form. Remove the crystals and dry them between pieces of filter paper.',
        guidance:
          'Excess copper oxide makes sure all the acid has reacted; filtering then removes it. Boiling the solution dry gives powder, not crystals.',
      }),
      short({
        seconds: 70,
        tier: 'higher',
        stem: 'The pH of a solution falls from 5 to 2. Work out how many times greater the concentration of hydrogen ions becomes.',
        lines: 2,
        answerLabel: 'Number of times greater =',
        answer: num(1000),
        recompute: () => 10 ** (5 - 2),
        model: '1000',
        points: [
          'A fall of one pH unit means ten times the concentration of hydrogen ions',
          point('1000', { allow: ['10³'] }),
        ],
        guidance: 'Three steps of one pH unit multiply by 10 each time. Adding to make 30 is the usual slip.',
      }),
      shortParts({
        seconds: 75,
        stem: `X, Y and Z are three metals. A student adds metal X to two solutions.

- X added to Y sulfate solution: no reaction
- X added to Z sulfate solution: a coating of metal Z forms on X`,
        guidance:
          'A metal displaces a less reactive metal from its compound. No reaction means the metal in the compound is the more reactive.',
        parts: [
          part({
            prompt: 'Which metal is the most reactive?',
            answer: words('Y', 'metal Y'),
            model: 'Y',
            points: ['Y'],
          }),
          part({
            prompt: 'Which metal is the least reactive?',
            answer: words('Z', 'metal Z'),
            model: 'Z',
            points: ['Z'],
          }),
        ],
      }),
      recall({
        seconds: 150,
        stem: 'Aluminium is extracted by electrolysis of a molten mixture of aluminium oxide and cryolite, using carbon electrodes. Explain why cryolite is used and why the positive electrodes must be replaced.',
        lines: 8,
        points: [
          point('The mixture melts at a lower temperature than pure aluminium oxide', {
            allow: ['cryolite lowers the melting point'],
            reject: ['cryolite is a catalyst', 'lowers the boiling point'],
          }),
          point('So less energy is needed', { allow: ['lower energy cost'] }),
          point('Oxygen forms at the positive electrode'),
          point('The oxygen reacts with the carbon to form carbon dioxide, so the electrode wears away', {
            reject: ['the electrode rusts'],
          }),
        ],
        model:
          'A mixture with cryolite melts at a lower temperature than pure aluminium oxide, so less energy is needed. Oxygen is produced at the positive electrode and reacts with the hot carbon to form carbon dioxide, so the electrode wears away and must be replaced.',
      }),
    ],
  },
  {
    number: '6',
    title: 'Energy changes',
    weights: { 1: 10 },
    questions: [
      short({
        seconds: 120,
        tier: 'higher',
        stem: r`Hydrogen reacts with chlorine.

$$
\text{H–H} + \text{Cl–Cl} \rightarrow 2\ \text{H–Cl}
$$

Bond energies in $\text{kJ/mol}$:

- $\text{H–H}$: $436$
- $\text{Cl–Cl}$: $242$
- $\text{H–Cl}$: $431$

Calculate the overall energy change for the reaction. Include the sign.`,
        lines: 4,
        answerLabel: 'Energy change =',
        answer: num(-184, { unit: 'kJ/mol' }),
        recompute: () => 436 + 242 - 2 * 431,
        model: '-184',
        points: [
          point(r`Bonds broken: $436 + 242 = 678\ (\text{kJ/mol})$`, { allow: ['678 seen'] }),
          point(r`Bonds made: $2 \times 431 = 862\ (\text{kJ/mol})$`, { allow: ['862 seen'] }),
          point(r`$678 - 862 = -184\ (\text{kJ/mol})$`, { reject: ['184 with no sign or a positive sign'] }),
        ],
        guidance:
          'Energy change is the energy to break bonds minus the energy released when bonds are made. More is released here, so the reaction is exothermic and the sign is negative.',
      }),
      short({
        seconds: 170,
        tier: 'higher',
        stem: r`Nitrogen reacts with hydrogen.

$$
\text{N}_2 + 3\text{H}_2 \rightarrow 2\text{NH}_3
$$

The overall energy change is $-93\ \text{kJ/mol}$.

The bond energy of $\text{N}\equiv\text{N}$ is $945\ \text{kJ/mol}$ and the bond energy of $\text{H–H}$ is $436\ \text{kJ/mol}$.

Each ammonia molecule contains three $\text{N–H}$ bonds. Calculate the bond energy of the $\text{N–H}$ bond.`,
        lines: 5,
        answerLabel: 'Bond energy =',
        answer: num(391, { unit: 'kJ/mol' }),
        recompute: () => (945 + 3 * 436 + 93) / 6,
        model: '391',
        points: [
          r`Bonds broken: $945 + (3 \times 436) = 2253\ (\text{kJ/mol})$`,
          r`Bonds made: $2253 + 93 = 2346\ (\text{kJ/mol})$`,
          r`$2346 \div 6$`,
          r`$391\ (\text{kJ/mol})$`,
        ],
        guidance:
          'The reaction is exothermic, so the bonds made release 93 kJ/mol more than breaking bonds takes in. There are six N–H bonds in two ammonia molecules.',
      }),
      shortParts({
        seconds: 60,
        stem: r`Zinc powder is stirred into copper sulfate solution. The temperature rises from $19.5\ ^\circ\text{C}$ to $47.0\ ^\circ\text{C}$.`,
        parts: [
          part({
            prompt: 'Calculate the temperature change.',
            answer: num(27.5, { unit: '°C' }),
            answerLabel: 'Temperature change =',
            recompute: () => 47.0 - 19.5,
            model: '27.5',
            points: [r`$27.5\ (^\circ\text{C})$`],
          }),
          part({
            prompt: 'State the name given to a reaction that transfers energy to the surroundings.',
            answer: exactly(
              ['exothermic', 'exothermic reaction', 'it is exothermic'],
              ['endothermic', 'endothermic reaction', 'it is endothermic'],
            ),
            model: 'exothermic',
            points: [point('exothermic', { reject: ['endothermic'] })],
          }),
        ],
      }),
      short({
        seconds: 35,
        stem: 'Name the minimum energy that colliding particles must have in order to react.',
        answer: words('activation energy', 'Ea'),
        model: 'activation energy',
        points: ['activation energy'],
      }),
      short({
        seconds: 80,
        stem: r`A student neutralises an acid four times and records the temperature rise each time.

- $12.4\ ^\circ\text{C}$
- $12.9\ ^\circ\text{C}$
- $9.1\ ^\circ\text{C}$
- $12.5\ ^\circ\text{C}$

One result is anomalous. Calculate the mean temperature rise, leaving out the anomalous result.`,
        lines: 3,
        answerLabel: 'Mean temperature rise =',
        answer: num(12.6, { unit: '°C' }),
        recompute: () => (12.4 + 12.9 + 12.5) / 3,
        model: '12.6',
        points: [r`$\dfrac{12.4 + 12.9 + 12.5}{3}$`, r`$12.6\ (^\circ\text{C})$`],
        guidance: r`$9.1$ does not fit with the rest. With it left out, divide by 3, not by 4.`,
      }),
      recall({
        seconds: 130,
        stem: 'A student measures the temperature rise when hydrochloric acid neutralises sodium hydroxide solution in an open glass beaker. The rise is smaller than expected. Explain why, and give two changes to the apparatus that would make the result more accurate.',
        lines: 6,
        points: [
          point('Energy is transferred to the surroundings, so the highest temperature measured is too low', {
            allow: ['heat is lost to the air or to the beaker'],
          }),
          point('Use a polystyrene cup in place of the glass beaker', {
            allow: ['wrap the beaker in an insulating material'],
          }),
          point('Put a lid on the container', { ignore: ['repeat the experiment'] }),
        ],
        model:
          'Some of the energy released is transferred to the surroundings, so the mixture does not get as hot as it should. Use a polystyrene cup, which is a better insulator than glass, and put a lid on it.',
        guidance: 'Repeating does not stop energy being lost. The question asks for changes to the apparatus.',
      }),
      recall({
        seconds: 160,
        stem: 'Describe the reaction profile (energy level diagram) of an exothermic reaction. Include how the activation energy and the overall energy change are shown.',
        lines: 8,
        points: [
          point('The products are at a lower energy than the reactants'),
          point('The curve rises from the reactants to a peak and then falls to the products'),
          point('The activation energy is the difference between the reactants and the peak', {
            reject: ['from the products to the peak'],
          }),
          point('The overall energy change is the difference between the reactants and the products'),
        ],
        model:
          'The line for the products is lower than the line for the reactants. The curve goes up from the reactants to a peak, then down to the products. The activation energy is the rise from the reactants to the peak. The overall energy change is the difference between the reactants and the products.',
      }),
      recall({
        seconds: 110,
        tier: 'higher',
        stem: 'Explain, in terms of making and breaking bonds, why the combustion of methane is exothermic.',
        lines: 6,
        points: [
          point('Energy is needed to break the bonds in methane and oxygen', {
            allow: ['breaking bonds is endothermic'],
          }),
          point('Energy is released when bonds form in carbon dioxide and water', {
            allow: ['making bonds is exothermic'],
            reject: ['energy is needed to make bonds'],
          }),
          point('More energy is released in making bonds than is needed to break bonds'),
        ],
        model:
          'Energy must be supplied to break the bonds in methane and oxygen. Energy is released when new bonds form in carbon dioxide and water. More energy is released than is taken in, so overall energy is transferred to the surroundings.',
        guidance: 'Breaking takes in, making gives out. The third mark is for comparing the two amounts.',
      }),
    ],
  },
];
