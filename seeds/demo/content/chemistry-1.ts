import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 1: atoms, bonding and amounts. */
export const chemistryTopics1To3: TopicContent[] = [
  {
    number: '1',
    title: 'Atoms, mixtures and the periodic table',
    weights: { 1: 20 },
    questions: [
      shortParts({
        seconds: 100,
        stem: r`An atom of phosphorus is represented as $^{31}_{15}\text{P}$.`,
        guidance:
          'The lower number counts protons; in a neutral atom it also counts electrons. Take it from the upper number to find the neutrons.',
        parts: [
          part({
            prompt: 'Give the number of protons in the atom.',
            answer: num(15),
            answerLabel: 'Protons =',
            model: '15',
            points: ['15 protons'],
          }),
          part({
            prompt: 'Give the number of neutrons in the atom.',
            answer: num(16),
            answerLabel: 'Neutrons =',
            recompute: () => 31 - 15,
            model: '16',
            points: ['16 neutrons'],
          }),
          part({
            prompt: 'Give the electronic structure of the atom.',
            answer: words(
              '2,8,5',
              '2, 8, 5',
              '2.8.5',
              '2. 8. 5',
              '2 8 5',
              '2-8-5',
              '2:8:5',
              '2;8;5',
              '2/8/5',
              '2+8+5',
              '2, 8 and 5',
            ),
            answerLabel: 'Electronic structure =',
            model: '2,8,5',
            points: [point('2,8,5', { allow: ['2.8.5', 'electrons drawn or listed shell by shell'] })],
          }),
        ],
      }),
      short({
        seconds: 90,
        stem: r`A sample of gallium contains two isotopes.

- $60.0\%$ of the atoms have mass number $69$
- $40.0\%$ of the atoms have mass number $71$

Calculate the relative atomic mass of the gallium in this sample. Give your answer to 3 significant figures.`,
        lines: 3,
        answerLabel: 'Relative atomic mass =',
        answer: num(69.8),
        recompute: () => (69 * 60 + 71 * 40) / 100,
        model: '69.8',
        points: [r`$\dfrac{(69 \times 60.0) + (71 \times 40.0)}{100}$`, '69.8'],
        guidance:
          'Weight each mass number by its abundance, then divide by 100. The answer must lie between 69 and 71, nearer to the commoner isotope.',
      }),
      short({
        seconds: 35,
        stem: 'State the name given to atoms of the same element that have different numbers of neutrons.',
        answer: exactly(['isotopes', 'isotope'], ['isotones', 'isomers']),
        model: 'isotopes',
        points: [point('isotopes', { reject: ['allotropes', 'isomers', 'ions'] })],
      }),
      recall({
        seconds: 130,
        stem: 'Alpha particles were fired at thin gold foil. Most passed straight through, some changed direction and a very small number bounced back. Explain what scientists concluded about the atom from each of these three results.',
        lines: 6,
        points: [
          point('Most passed straight through, so most of the atom is empty space', {
            reject: ['the atom is full of air'],
          }),
          point(
            'Some changed direction because they were repelled, so the centre of the atom (nucleus) is positively charged',
            { allow: ['like charges repel, as alpha particles are positive'] },
          ),
          point('Very few bounced back, so the mass of the atom is concentrated in a very small nucleus at the centre'),
        ],
        model:
          'Most alpha particles passed straight through, so most of the atom is empty space. Some were deflected because positive alpha particles were repelled by a positive nucleus. Very few bounced back, so the mass must be concentrated in a very small nucleus.',
        guidance:
          'Tie each conclusion to its own result. A list of facts about the nuclear model with no evidence attached earns little.',
      }),
      recall({
        seconds: 110,
        stem: 'Explain why the elements in Group 1 become more reactive going down the group.',
        lines: 6,
        points: [
          point('The outer electron is further from the nucleus', {
            allow: ['the atoms have more shells', 'the atoms are larger'],
          }),
          point('So the attraction between the nucleus and the outer electron is weaker', {
            allow: ['more shielding by inner electrons'],
            reject: ['magnetic attraction'],
          }),
          point('So the outer electron is lost more easily', { reject: ['electrons are gained'] }),
        ],
        model:
          'Going down the group the atoms have more shells, so the outer electron is further from the nucleus. The attraction of the nucleus for it is weaker, so the outer electron is lost more easily.',
        guidance: 'Say outer electron each time. "It is further away" does not make clear what is further from what.',
      }),
      shortParts({
        seconds: 75,
        stem: 'Chlorine is bubbled into a colourless solution of potassium bromide.',
        parts: [
          part({
            prompt: 'State the colour of the solution after the reaction.',
            answer: wording(
              'orange',
              'yellow',
              'brown',
              'yellow-orange',
              'orange-yellow',
              'orange-brown',
              'brown-orange',
              'yellow-brown',
              'red-brown',
              'yellow orange',
              'orange brown',
            ),
            model: 'orange',
            points: [point('orange', { allow: ['yellow', 'brown'], reject: ['purple', 'green'] })],
          }),
          part({
            prompt: 'Name the product that causes this colour.',
            answer: exactly(['bromine', 'Br2', 'bromine solution', 'aqueous bromine', 'bromine water'], ['bromide']),
            model: 'bromine',
            points: [point('bromine', { allow: ['Br₂'], reject: ['bromide'] })],
          }),
          part({
            prompt:
              'Name the type of reaction in which a more reactive element takes the place of a less reactive one in a compound.',
            answer: words('displacement', 'displacement reaction', 'halogen displacement'),
            model: 'displacement',
            points: ['displacement'],
          }),
        ],
      }),
      short({
        seconds: 80,
        stem: r`On a paper chromatogram the solvent front is $7.5\ \text{cm}$ from the start line. The centre of a blue spot is $4.2\ \text{cm}$ from the start line. Calculate the $R_\text{f}$ value of the blue dye.`,
        lines: 2,
        answerLabel: 'Rf =',
        answer: num(0.56),
        recompute: () => 4.2 / 7.5,
        model: '0.56',
        points: [r`$\dfrac{4.2}{7.5}$`, point('0.56', { reject: ['an answer with a unit'] })],
        guidance: r`$R_\text{f}$ is the distance moved by the substance divided by the distance moved by the solvent, so it is never more than 1 and has no unit.`,
      }),
      recall({
        seconds: 150,
        stem: 'Describe how to obtain dry crystals of sodium chloride from a mixture of sodium chloride and sand.',
        lines: 7,
        points: [
          point('Add water and stir to dissolve the sodium chloride', { reject: ['melt'] }),
          point('Filter to remove the sand'),
          point('Heat the filtrate to evaporate some of the water', {
            allow: ['leave the filtrate in a warm place so that water evaporates'],
          }),
          point('Leave to crystallise, then dry the crystals between filter papers or in a warm oven', {
            ignore: ['heat until all the water has gone'],
          }),
        ],
        model:
          'Add water to the mixture and stir so that the salt dissolves. Filter to remove the sand. Heat the filtrate to evaporate some of the water, then leave it to cool and crystallise. Dry the crystals between pieces of filter paper.',
      }),
    ],
  },
  {
    number: '2',
    title: 'Structure and bonding',
    weights: { 1: 22 },
    questions: [
      shortParts({
        seconds: 75,
        stem: r`Some ions are $\text{Ca}^{2+}$, $\text{Al}^{3+}$, $\text{Cl}^-$ and $\text{O}^{2-}$.`,
        guidance:
          'The total positive charge must balance the total negative charge. The charges themselves are not written in the formula.',
        parts: [
          part({
            prompt: 'Give the formula of calcium chloride.',
            answer: words('CaCl2', 'CaCl₂', 'CaCl_2'),
            answerLabel: 'Formula =',
            model: 'CaCl2',
            points: [r`$\text{CaCl}_2$`],
          }),
          part({
            prompt: 'Give the formula of aluminium oxide.',
            answer: words('Al2O3', 'Al₂O₃', 'Al_2O_3'),
            answerLabel: 'Formula =',
            model: 'Al2O3',
            points: [r`$\text{Al}_2\text{O}_3$`],
          }),
        ],
      }),
      recall({
        seconds: 150,
        stem: 'Magnesium (electronic structure 2,8,2) reacts with fluorine (electronic structure 2,7) to form magnesium fluoride. Describe what happens to magnesium atoms and fluorine atoms in this reaction. Refer to electrons and to the ions formed.',
        lines: 8,
        points: [
          point('Each magnesium atom loses two electrons', { reject: ['electrons are shared'] }),
          point('Each fluorine atom gains one electron', { reject: ['electrons are shared', 'fluoride atom'] }),
          point('One magnesium atom reacts with two fluorine atoms', {
            allow: ['the formula MgF₂', 'two fluoride ions for each magnesium ion'],
          }),
          point(r`The ions formed are $\text{Mg}^{2+}$ and $\text{F}^-$`, {
            allow: ['magnesium ions with a 2+ charge and fluoride ions with a 1− charge'],
          }),
        ],
        model: r`Each magnesium atom transfers two electrons, one to each of two fluorine atoms. The magnesium atom loses two electrons and becomes $\text{Mg}^{2+}$. Each fluorine atom gains one electron and becomes $\text{F}^-$.`,
        guidance:
          'Give the number of electrons lost by each atom and gained by each atom; "transfers electrons" alone is not enough.',
      }),
      recall({
        seconds: 120,
        stem: 'Graphite conducts electricity but diamond does not. Explain why, in terms of structure and bonding.',
        lines: 6,
        points: [
          point('In graphite each carbon atom forms three covalent bonds, so one electron per atom is delocalised', {
            allow: ['graphite has free electrons'],
          }),
          point('The delocalised electrons can move through the graphite and carry charge', {
            allow: ['carry the current'],
            ignore: ['carry electricity'],
          }),
          point('In diamond each carbon atom forms four covalent bonds, so there are no delocalised electrons', {
            reject: ['ions are fixed'],
          }),
        ],
        model:
          'In graphite each carbon atom is bonded to three others, leaving one delocalised electron per atom. These electrons move through the structure and carry charge. In diamond each carbon atom forms four covalent bonds, so no electrons are free to move.',
      }),
      short({
        seconds: 45,
        stem: 'A solid melts above 1600 °C. It does not dissolve in water, and it does not conduct electricity when solid or when molten. Name the type of structure of this solid.',
        answer: words(
          'giant covalent',
          'giant covalent structure',
          'giant covalent lattice',
          'covalent giant structure',
          'giant covalent network',
          'giant covalent bonding',
          'network covalent',
          'covalent network',
          'network covalent structure',
          'macromolecular',
          'macromolecule',
          'giant molecular',
          'giant molecular structure',
        ),
        model: 'giant covalent',
        points: [
          point('giant covalent', {
            allow: ['macromolecular'],
            reject: ['giant ionic', 'simple covalent', 'metallic'],
          }),
        ],
        guidance:
          'The very high melting point rules out small molecules. No conduction when molten rules out ionic and metallic structures.',
      }),
      recall({
        seconds: 100,
        stem: 'Methane boils at −162 °C. Explain why methane has a low boiling point.',
        lines: 5,
        points: [
          point('Methane is made of small molecules', { allow: ['simple molecular structure'] }),
          point('The forces between the molecules are weak', {
            allow: ['weak intermolecular forces'],
            reject: ['weak covalent bonds'],
          }),
          point('So little energy is needed to overcome these forces', { reject: ['break covalent bonds'] }),
        ],
        model:
          'Methane consists of small molecules with weak intermolecular forces between them. Only a little energy is needed to overcome these forces, so it boils at a low temperature.',
        guidance:
          'Covalent bonds are strong and do not break when methane boils. Writing that they break loses the marks.',
      }),
      shortParts({
        seconds: 75,
        stem: r`A nitrogen atom has the electronic structure 2,5. A hydrogen atom has one electron. Nitrogen and hydrogen react to form ammonia, $\text{NH}_3$.`,
        parts: [
          part({
            prompt: 'Give the number of covalent bonds in one molecule of ammonia.',
            answer: num(3),
            recompute: () => 8 - 5,
            model: '3',
            points: ['3'],
          }),
          part({
            prompt:
              'Give the number of outer electrons of the nitrogen atom that are not used in bonding in the molecule.',
            answer: num(2),
            recompute: () => 5 - 3,
            model: '2',
            points: [point('2', { reject: ['1'] })],
          }),
        ],
      }),
      shortParts({
        seconds: 90,
        stem: r`The melting points and boiling points of three substances are given.

- P melts at $-7\ ^\circ\text{C}$ and boils at $59\ ^\circ\text{C}$
- Q melts at $801\ ^\circ\text{C}$ and boils at $1413\ ^\circ\text{C}$
- R melts at $-101\ ^\circ\text{C}$ and boils at $-35\ ^\circ\text{C}$`,
        guidance:
          'Below its melting point a substance is solid, above its boiling point it is a gas, and between the two it is liquid.',
        parts: [
          part({
            prompt: r`Which substance is a liquid at $25\ ^\circ\text{C}$?`,
            answer: words('P', 'substance P'),
            model: 'P',
            points: ['P'],
          }),
          part({
            prompt: r`Which substance is a gas at $-20\ ^\circ\text{C}$?`,
            answer: words('R', 'substance R'),
            model: 'R',
            points: ['R'],
          }),
          part({
            prompt: r`Which substance is a liquid at $1000\ ^\circ\text{C}$?`,
            answer: words('Q', 'substance Q'),
            model: 'Q',
            points: ['Q'],
          }),
        ],
      }),
      recall({
        seconds: 100,
        stem: 'Explain why brass, an alloy of copper and zinc, is harder than pure copper.',
        lines: 5,
        points: [
          point('Copper and zinc atoms are different sizes', { reject: ['different sized molecules'] }),
          point('So the layers of atoms are distorted', { allow: ['the regular arrangement is disrupted'] }),
          point('So the layers slide over each other less easily', { allow: ['the layers cannot slide'] }),
        ],
        model:
          'The zinc atoms are a different size from the copper atoms, so they distort the regular layers. The layers cannot slide over each other as easily, so brass is harder.',
      }),
    ],
  },
  {
    number: '3',
    title: 'Quantitative chemistry',
    weights: { 1: 18 },
    questions: [
      short({
        seconds: 75,
        stem: r`Calculate the relative formula mass ($M_\text{r}$) of calcium nitrate, $\text{Ca(NO}_3)_2$.

Relative atomic masses ($A_\text{r}$): $\text{N} = 14$, $\text{O} = 16$, $\text{Ca} = 40$`,
        lines: 2,
        answerLabel: 'Relative formula mass =',
        answer: num(164),
        recompute: () => 40 + 2 * (14 + 3 * 16),
        model: '164',
        points: [r`$40 + 2 \times (14 + 3 \times 16)$`, '164'],
        guidance: 'The 2 outside the bracket doubles everything inside it: two nitrogen atoms and six oxygen atoms.',
      }),
      short({
        seconds: 90,
        stem: r`Ammonium nitrate, $\text{NH}_4\text{NO}_3$, is used as a fertiliser. Calculate the percentage by mass of nitrogen in ammonium nitrate.

Relative atomic masses ($A_\text{r}$): $\text{H} = 1$, $\text{N} = 14$, $\text{O} = 16$`,
        lines: 3,
        answerLabel: 'Percentage by mass =',
        answer: num(35, { unit: '%' }),
        recompute: () => ((2 * 14) / (2 * 14 + 4 * 1 + 3 * 16)) * 100,
        model: '35',
        points: [r`$M_\text{r} = 80$, or $\dfrac{28}{80}$ seen`, r`$35\ (\%)$`],
        guidance: 'There are two nitrogen atoms in the formula, so 28 goes on top, not 14.',
      }),
      short({
        seconds: 75,
        tier: 'higher',
        stem: r`Calculate the number of moles in $5.30\ \text{g}$ of sodium carbonate, $\text{Na}_2\text{CO}_3$.

Relative formula mass ($M_\text{r}$): $\text{Na}_2\text{CO}_3 = 106$`,
        lines: 2,
        answerLabel: 'Number of moles =',
        answer: num(0.05, { unit: 'mol' }),
        recompute: () => 5.3 / 106,
        model: '0.0500',
        points: [r`$\dfrac{5.30}{106}$`, r`$0.0500\ (\text{mol})$`],
      }),
      shortParts({
        seconds: 60,
        stem: r`Aluminium burns in oxygen. The equation for the reaction is

$$
4\text{Al} + x\text{O}_2 \rightarrow y\text{Al}_2\text{O}_3
$$`,
        guidance:
          'Start with the aluminium: four atoms on the left need two units of the oxide on the right. Then count the oxygen.',
        parts: [
          part({
            prompt: r`Give the value of $x$ that balances the equation.`,
            answer: num(3),
            answerLabel: 'x =',
            recompute: () => (2 * 3) / 2,
            model: '3',
            points: ['3'],
          }),
          part({
            prompt: r`Give the value of $y$ that balances the equation.`,
            answer: num(2),
            answerLabel: 'y =',
            recompute: () => 4 / 2,
            model: '2',
            points: ['2'],
          }),
        ],
      }),
      short({
        seconds: 140,
        tier: 'higher',
        stem: r`Iron is extracted from iron(III) oxide.

$$
\text{Fe}_2\text{O}_3 + 3\text{CO} \rightarrow 2\text{Fe} + 3\text{CO}_2
$$

Calculate the maximum mass of iron that can be made from $48.0\ \text{g}$ of iron(III) oxide.

Relative atomic masses ($A_\text{r}$): $\text{O} = 16$, $\text{Fe} = 56$`,
        lines: 4,
        answerLabel: 'Mass of iron =',
        answer: num(33.6, { unit: 'g' }),
        recompute: () => (48 / (2 * 56 + 3 * 16)) * 2 * 56,
        model: '33.6',
        points: [
          r`Moles of $\text{Fe}_2\text{O}_3 = \dfrac{48.0}{160} = 0.300$`,
          r`Moles of $\text{Fe} = 2 \times 0.300 = 0.600$`,
          r`$0.600 \times 56 = 33.6\ (\text{g})$`,
        ],
        guidance:
          'Mass to moles, use the ratio in the equation, moles back to mass. Missing the factor of 2 gives 16.8 g.',
      }),
      shortParts({
        seconds: 160,
        tier: 'higher',
        stem: r`A student adds $3.6\ \text{g}$ of magnesium to a solution containing $7.3\ \text{g}$ of hydrogen chloride, $\text{HCl}$.

$$
\text{Mg} + 2\text{HCl} \rightarrow \text{MgCl}_2 + \text{H}_2
$$

Relative atomic masses ($A_\text{r}$): $\text{H} = 1$, $\text{Mg} = 24$, $\text{Cl} = 35.5$`,
        guidance:
          'Compare the moles of each reactant with the ratio in the equation. The mass of product depends on the limiting reactant only.',
        parts: [
          part({
            prompt: 'Work out which reactant is the limiting reactant.',
            lines: 3,
            answer: wording('hydrochloric acid', 'HCl', 'acid', 'hydrogen chloride', 'hydrochloric acid (HCl)'),
            answerLabel: 'Limiting reactant:',
            model: 'hydrochloric acid',
            points: [
              r`Moles of $\text{Mg} = \dfrac{3.6}{24} = 0.15$ and moles of $\text{HCl} = \dfrac{7.3}{36.5} = 0.20$`,
              point('0.15 mol of magnesium would need 0.30 mol of acid, so the acid is limiting', {
                allow: ['0.20 mol of acid reacts with only 0.10 mol of magnesium'],
              }),
            ],
          }),
          part({
            prompt: 'Calculate the maximum mass of hydrogen that can be made.',
            lines: 2,
            answer: num(0.2, { unit: 'g' }),
            answerLabel: 'Mass of hydrogen =',
            recompute: () => (7.3 / (1 + 35.5) / 2) * 2,
            model: '0.20',
            points: [r`Moles of $\text{H}_2 = \dfrac{0.20}{2} = 0.10$`, r`$0.10 \times 2 = 0.20\ (\text{g})$`],
          }),
        ],
      }),
      short({
        seconds: 75,
        stem: r`A student dissolves $4.5\ \text{g}$ of sodium chloride in water and makes the solution up to $250\ \text{cm}^3$. Calculate the concentration of the solution in $\text{g/dm}^3$.`,
        lines: 3,
        answerLabel: 'Concentration =',
        answer: num(18, { unit: 'g/dm³' }),
        recompute: () => 4.5 / (250 / 1000),
        model: '18',
        points: [r`$\dfrac{4.5}{0.250}$, or $4.5 \times \dfrac{1000}{250}$`, r`$18\ (\text{g/dm}^3)$`],
        guidance: r`Divide $\text{cm}^3$ by 1000 to get $\text{dm}^3$ before you divide the mass by the volume.`,
      }),
      short({
        seconds: 75,
        stem: r`A solution of potassium chloride has a concentration of $24\ \text{g/dm}^3$. Calculate the mass of potassium chloride in $150\ \text{cm}^3$ of this solution. Give the unit.`,
        lines: 3,
        answerLabel: 'Mass =',
        answer: num(3.6, { unit: 'g', isUnitRequired: true }),
        recompute: () => 24 * (150 / 1000),
        model: '3.6 g',
        points: [r`$24 \times \dfrac{150}{1000}$`, point(r`$3.6\ \text{g}$`, { reject: ['an answer with no unit'] })],
      }),
      recall({
        seconds: 110,
        stem: 'A student heats calcium carbonate strongly in an open crucible. The mass of the contents falls. Explain how this fits with the law of conservation of mass.',
        lines: 6,
        points: [
          point(
            'In a reaction no atoms are lost or made, so the total mass of products equals the total mass of reactants',
            {
              allow: ['mass is not created or destroyed'],
            },
          ),
          point('Carbon dioxide gas is produced', { ignore: ['a gas is produced, if not named'] }),
          point('The gas escapes from the crucible, so its mass is not measured', {
            reject: ['calcium carbonate evaporates'],
          }),
        ],
        model:
          'Mass is conserved: the total mass of the products equals the mass of calcium carbonate. One product is carbon dioxide, a gas, which escapes from the crucible into the air, so only the calcium oxide left behind is weighed.',
      }),
    ],
  },
];
