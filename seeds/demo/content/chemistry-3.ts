import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 2: rates, organic chemistry, tests, and the atmosphere and resources. */
export const chemistryTopics7To10: TopicContent[] = [
  {
    number: '7',
    title: 'Rate and extent of reaction',
    weights: { 2: 30 },
    questions: [
      short({
        seconds: 85,
        stem: r`Magnesium reacts with dilute hydrochloric acid. $72\ \text{cm}^3$ of hydrogen is collected in the first $45\ \text{s}$. Calculate the mean rate of reaction. Give the unit.`,
        lines: 3,
        answerLabel: 'Mean rate =',
        answer: num(1.6, { unit: 'cm³/s', isUnitRequired: true }),
        recompute: () => 72 / 45,
        model: '1.6 cm³/s',
        points: [
          r`$\dfrac{72}{45}$`,
          '1.6',
          point(r`$\text{cm}^3\text{/s}$`, { allow: ['cm³ per second', 'cm³ s⁻¹'] }),
        ],
        guidance: 'The unit follows the calculation: cubic centimetres divided by seconds.',
      }),
      short({
        seconds: 90,
        tier: 'higher',
        stem: r`A graph shows the volume of gas made against time. A tangent is drawn to the curve at $40\ \text{s}$. The tangent passes through the points $(20\ \text{s},\ 30\ \text{cm}^3)$ and $(60\ \text{s},\ 54\ \text{cm}^3)$. Calculate the rate of reaction at $40\ \text{s}$.`,
        lines: 3,
        answerLabel: 'Rate =',
        answer: num(0.6, { unit: 'cm³/s' }),
        recompute: () => (54 - 30) / (60 - 20),
        model: '0.60',
        points: [r`$\dfrac{54 - 30}{60 - 20}$`, r`$0.60\ (\text{cm}^3\text{/s})$`],
        guidance: 'The rate at one moment is the gradient of the tangent: change in volume divided by change in time.',
      }),
      shortParts({
        seconds: 110,
        stem: r`Calcium carbonate reacts with acid in an open flask on a balance. The reading falls from $184.62\ \text{g}$ to $183.86\ \text{g}$ in $80\ \text{s}$.`,
        parts: [
          part({
            prompt: 'Calculate the mass of gas given off.',
            answer: num(0.76, { unit: 'g' }),
            answerLabel: 'Mass =',
            recompute: () => 184.62 - 183.86,
            model: '0.76',
            points: [r`$0.76\ (\text{g})$`],
          }),
          part({
            prompt: 'Calculate the mean rate of reaction.',
            lines: 2,
            answer: num(0.0095, { unit: 'g/s' }),
            answerLabel: 'Mean rate =',
            recompute: () => (184.62 - 183.86) / 80,
            model: '0.0095',
            points: [r`$\dfrac{0.76}{80}$`, r`$0.0095\ (\text{g/s})$`],
          }),
        ],
      }),
      recall({
        seconds: 120,
        stem: 'Explain, in terms of particles and collisions, why increasing the temperature increases the rate of a reaction.',
        lines: 6,
        points: [
          point('The particles have more kinetic energy, so they move faster', { ignore: ['particles vibrate more'] }),
          point('So they collide more frequently', {
            allow: ['more collisions per second'],
            reject: ['more collisions, with no idea of time'],
          }),
          point('A greater proportion of collisions have at least the activation energy', {
            allow: ['more of the particles have enough energy to react', 'more successful collisions'],
            reject: ['the activation energy is lowered'],
          }),
        ],
        model:
          'At a higher temperature the particles have more kinetic energy and move faster. They collide more frequently, and a greater proportion of the collisions have at least the activation energy.',
        guidance: 'Two separate effects are needed: collisions are more frequent, and more of them are successful.',
      }),
      recall({
        seconds: 100,
        stem: 'Explain what a catalyst does and how it works.',
        lines: 5,
        points: [
          point('It increases the rate of a reaction', { reject: ['changes the rate, with no direction'] }),
          point('It is not used up in the reaction', { allow: ['chemically unchanged at the end'] }),
          point('It provides a different pathway with a lower activation energy', {
            reject: ['gives the particles more energy'],
          }),
        ],
        model:
          'A catalyst increases the rate of a reaction without being used up. It provides a different reaction pathway that has a lower activation energy.',
      }),
      shortParts({
        seconds: 110,
        stem: r`A cube of marble has sides of $2\ \text{cm}$. It is cut into eight cubes with sides of $1\ \text{cm}$.`,
        guidance:
          'A cube has six faces. The volume of marble is unchanged, so the smaller pieces have twice the surface area to volume ratio.',
        parts: [
          part({
            prompt: 'Calculate the surface area of the large cube.',
            answer: num(24, { unit: 'cm²' }),
            answerLabel: 'Surface area =',
            recompute: () => 6 * 2 * 2,
            model: '24',
            points: [r`$24\ (\text{cm}^2)$`],
          }),
          part({
            prompt: 'Calculate the total surface area of the eight small cubes.',
            lines: 2,
            answer: num(48, { unit: 'cm²' }),
            answerLabel: 'Total surface area =',
            recompute: () => 8 * 6 * 1 * 1,
            model: '48',
            points: [r`$8 \times 6 \times 1 \times 1$`, r`$48\ (\text{cm}^2)$`],
          }),
        ],
      }),
      recall({
        seconds: 160,
        tier: 'higher',
        stem: r`Nitrogen and hydrogen react to form ammonia. The forward reaction is exothermic.

$$
\text{N}_2(\text{g}) + 3\text{H}_2(\text{g}) \rightleftharpoons 2\text{NH}_3(\text{g})
$$

Explain the effect on the yield of ammonia at equilibrium of (i) increasing the pressure, (ii) increasing the temperature.`,
        lines: 8,
        points: [
          point('Increasing the pressure increases the yield', { allow: ['equilibrium shifts to the right'] }),
          point('Because there are fewer molecules of gas on the right-hand side', {
            allow: ['4 molecules on the left and 2 on the right'],
          }),
          point('Increasing the temperature decreases the yield', { allow: ['equilibrium shifts to the left'] }),
          point('Because the reverse reaction is endothermic and is favoured', {
            ignore: ['statements about rate'],
          }),
        ],
        model:
          'Increasing the pressure increases the yield, because the equilibrium moves to the side with fewer gas molecules: two on the right compared with four on the left. Increasing the temperature decreases the yield, because the equilibrium moves in the endothermic direction, which is the reverse reaction.',
        guidance: 'Yield and rate are different ideas. Collisions earn nothing here.',
      }),
      short({
        seconds: 50,
        stem: 'A reversible reaction takes place in a closed container and reaches equilibrium. State how the rate of the forward reaction compares with the rate of the reverse reaction at equilibrium.',
        answer: wording(
          'equal',
          'they are equal',
          'the rates are equal',
          'the same',
          'same',
          'they are the same',
          'the rates are the same',
          'both are the same',
          'it is the same',
          'it is equal',
          'same rate',
          'at the same rate',
          'exactly the same',
          'the forward rate equals the reverse rate',
        ),
        model: 'they are equal',
        points: [
          point('The two rates are equal', { reject: ['both reactions have stopped', 'the concentrations are equal'] }),
        ],
      }),
      shortParts({
        seconds: 90,
        stem: r`Hydrated copper sulfate forms anhydrous copper sulfate and water when it is heated. The reaction is reversible.`,
        guidance:
          'The energy taken in by one direction of a reversible reaction equals the energy given out by the other.',
        parts: [
          part({
            prompt: 'State the colour of hydrated copper sulfate.',
            answer: words('blue', 'bright blue', 'deep blue', 'dark blue', 'light blue', 'pale blue', 'sky blue'),
            model: 'blue',
            points: ['blue'],
          }),
          part({
            prompt: 'State the colour of anhydrous copper sulfate.',
            answer: words('white', 'off-white', 'off white', 'white powder', 'white solid'),
            model: 'white',
            points: [point('white', { reject: ['clear', 'colourless'] })],
          }),
          part({
            prompt: r`Heating a sample takes in $7.8\ \text{kJ}$ of energy from the surroundings. Give the energy transferred to the surroundings when the same sample turns completely back into hydrated copper sulfate.`,
            answer: num(7.8, { unit: 'kJ' }),
            answerLabel: 'Energy =',
            model: '7.8',
            points: [r`$7.8\ (\text{kJ})$`],
          }),
        ],
      }),
      recall({
        seconds: 230,
        stem: 'Sodium thiosulfate solution reacts with dilute hydrochloric acid and a solid makes the mixture cloudy. Describe how to investigate the effect of the concentration of sodium thiosulfate solution on the rate of this reaction.',
        lines: 10,
        points: [
          point('Put a measured volume of sodium thiosulfate solution in a flask standing on a marked cross'),
          point('Add a measured volume of acid, swirl and start a stop clock'),
          point('Look down through the mixture and stop the clock when the cross can no longer be seen', {
            allow: ['use a light sensor and record the time to reach a set reading'],
          }),
          point('Repeat with different concentrations of sodium thiosulfate solution', {
            allow: ['dilute with different volumes of water'],
          }),
          point('Keep other variables the same, such as temperature, total volume and concentration of acid', {
            allow: ['one named control variable'],
          }),
        ],
        model:
          'Measure 50 cm³ of sodium thiosulfate solution into a conical flask standing on a black cross. Add 10 cm³ of dilute hydrochloric acid, swirl and start a stop clock. Look down through the flask and stop the clock when the cross disappears. Repeat with different concentrations of sodium thiosulfate solution, made by diluting it with water. Keep the temperature, the total volume and the concentration of acid the same.',
        guidance: 'Name the variable you change, what you time and at least one variable you control.',
      }),
    ],
  },
  {
    number: '8',
    title: 'Crude oil and organic chemistry',
    weights: { 2: 26 },
    questions: [
      short({
        seconds: 45,
        stem: r`The general formula of the alkanes is $\text{C}_n\text{H}_{2n+2}$. Give the molecular formula of the alkane with eight carbon atoms in each molecule.`,
        answerLabel: 'Formula =',
        answer: words('C8H18', 'C₈H₁₈', 'C_8H_18', 'C_8H_{18}'),
        model: 'C8H18',
        points: [r`$\text{C}_8\text{H}_{18}$`],
      }),
      shortParts({
        seconds: 100,
        stem: r`Propane burns completely in oxygen. The equation for the reaction is

$$
\text{C}_3\text{H}_8 + x\text{O}_2 \rightarrow y\text{CO}_2 + z\text{H}_2\text{O}
$$`,
        guidance: 'Balance carbon, then hydrogen, then count all the oxygen atoms on the right and halve the number.',
        parts: [
          part({
            prompt: r`Give the value of $y$.`,
            answer: num(3),
            answerLabel: 'y =',
            model: '3',
            points: ['3'],
          }),
          part({
            prompt: r`Give the value of $z$.`,
            answer: num(4),
            answerLabel: 'z =',
            recompute: () => 8 / 2,
            model: '4',
            points: ['4'],
          }),
          part({
            prompt: r`Give the value of $x$.`,
            answer: num(5),
            answerLabel: 'x =',
            recompute: () => (3 * 2 + 4) / 2,
            model: '5',
            points: ['5'],
          }),
        ],
      }),
      shortParts({
        seconds: 110,
        stem: r`Decane is cracked. X is an alkene.

$$
\text{C}_{10}\text{H}_{22} \rightarrow \text{C}_6\text{H}_{14} + 2\text{X}
$$`,
        guidance:
          'Take the atoms of the alkane product from the atoms of decane, then share what is left between two molecules.',
        parts: [
          part({
            prompt: 'Give the molecular formula of X.',
            lines: 2,
            answer: words('C2H4', 'C₂H₄', 'C_2H_4'),
            answerLabel: 'Formula of X =',
            model: 'C2H4',
            points: [r`$\text{C}_2\text{H}_4$`],
          }),
          part({
            prompt: 'Name the orange solution that can be used to test for an alkene.',
            answer: exactly(
              ['bromine water', 'bromine', 'bromine solution', 'aqueous bromine', 'Br2', 'Br2(aq)'],
              ['bromide', 'bromide water', 'bromide solution'],
            ),
            model: 'bromine water',
            points: [point('bromine water', { allow: ['bromine'], reject: ['bromide'] })],
          }),
          part({
            prompt: 'State the colour of the mixture after an alkene has reacted with all of this solution.',
            answer: words(
              'colourless',
              'colorless',
              'it is colourless',
              'no colour',
              'none',
              'it goes colourless',
              'it turns colourless',
            ),
            model: 'colourless',
            points: [point('colourless', { reject: ['clear', 'white'] })],
          }),
        ],
      }),
      recall({
        seconds: 160,
        stem: 'Describe how crude oil is separated into fractions by fractional distillation.',
        lines: 8,
        points: [
          point('The crude oil is heated so that most of it evaporates', { allow: ['boiled', 'vaporised'] }),
          point('The vapour enters a column that is hotter at the bottom and cooler at the top', {
            allow: ['a temperature gradient in the column'],
          }),
          point('The vapours rise, cool, and condense where the temperature falls below their boiling points', {
            allow: ['different hydrocarbons condense at different temperatures'],
          }),
          point('Fractions with lower boiling points (smaller molecules) are collected higher up the column'),
        ],
        model:
          'Crude oil is heated so that it evaporates. The vapour goes into a fractionating column that is hot at the bottom and cooler towards the top. The vapours rise and each condenses where the temperature falls below its boiling point. Fractions with small molecules and low boiling points are collected near the top.',
        guidance:
          'The marks are for heating and evaporating, the temperature gradient, condensing at different levels, and which fractions go where.',
      }),
      shortParts({
        seconds: 90,
        stem: r`Hexane is $\text{C}_6\text{H}_{14}$ and eicosane is $\text{C}_{20}\text{H}_{42}$. Compare eicosane with hexane. Answer **higher** or **lower** to each.`,
        guidance:
          'Longer molecules attract each other more strongly: they boil at higher temperatures, flow less easily and catch fire less easily.',
        parts: [
          part({
            prompt: 'Boiling point of eicosane',
            answer: words('higher', 'it is higher'),
            model: 'higher',
            points: ['higher'],
          }),
          part({
            prompt: 'Viscosity of eicosane at the same temperature',
            answer: words('higher', 'it is higher'),
            model: 'higher',
            points: ['higher'],
          }),
          part({
            prompt: 'Flammability of eicosane',
            answer: words('lower', 'it is lower'),
            model: 'lower',
            points: ['lower'],
          }),
        ],
      }),
      recall({
        seconds: 100,
        stem: 'Explain why oil companies crack the long-chain fractions from crude oil.',
        lines: 5,
        points: [
          point('There is more demand for shorter-chain fractions than fractional distillation supplies', {
            allow: ['supply of long-chain fractions is greater than demand'],
          }),
          point('Shorter-chain alkanes are more useful as fuels', { allow: ['burn more easily', 'more flammable'] }),
          point('Cracking also makes alkenes, which are used to make polymers', {
            allow: ['alkenes used as starting materials for other chemicals'],
          }),
        ],
        model:
          'Fractional distillation does not supply enough of the shorter-chain fractions to meet demand, and gives more of the long-chain fractions than are needed. Cracking makes shorter alkanes that are better fuels, and alkenes that are used to make polymers.',
      }),
      short({
        seconds: 90,
        stem: r`Calculate the percentage by mass of carbon in propane, $\text{C}_3\text{H}_8$. Give your answer to 3 significant figures.

Relative atomic masses ($A_\text{r}$): $\text{H} = 1$, $\text{C} = 12$`,
        lines: 3,
        answerLabel: 'Percentage by mass =',
        answer: num(81.8, { tolerance: 0.05, unit: '%' }),
        recompute: () => ((3 * 12) / (3 * 12 + 8)) * 100,
        model: '81.8',
        points: [r`$\dfrac{36}{44}$`, r`$81.8\ (\%)$`],
      }),
      recall({
        seconds: 110,
        stem: 'Two colourless liquids are hexane (an alkane) and hexene (an alkene). Describe a test to tell them apart and give the result for each liquid.',
        lines: 5,
        points: [
          point('Add bromine water to each liquid and shake', { allow: ['bromine'], reject: ['bromide'] }),
          point('With hexene the bromine water turns from orange to colourless', {
            allow: ['decolourised'],
            reject: ['turns clear'],
          }),
          point('With hexane it stays orange', { allow: ['no change', 'no reaction'] }),
        ],
        model:
          'Add bromine water to a sample of each and shake. With hexene the orange colour disappears and the mixture becomes colourless. With hexane the mixture stays orange.',
        guidance: 'Write colourless, not clear: an orange solution can be clear. Give what is seen with both liquids.',
      }),
    ],
  },
  {
    number: '9',
    title: 'Chemical tests',
    weights: { 2: 16 },
    isSeparateOnly: true,
    questions: [
      shortParts({
        seconds: 100,
        stem: 'Flame tests identify some metal ions. Name the metal whose ions give each flame colour.',
        parts: [
          part({
            prompt: 'Crimson',
            answer: words('lithium', 'Li', 'Li+', 'Li⁺', 'lithium ion', 'lithium ions'),
            model: 'lithium',
            points: ['lithium'],
          }),
          part({
            prompt: 'Lilac',
            answer: words('potassium', 'K', 'K+', 'K⁺', 'potassium ion', 'potassium ions'),
            model: 'potassium',
            points: ['potassium'],
          }),
          part({
            prompt: 'Orange-red',
            answer: words('calcium', 'Ca', 'Ca2+', 'Ca²⁺', 'calcium ion', 'calcium ions'),
            model: 'calcium',
            points: ['calcium'],
          }),
        ],
        guidance: 'Learn five: lithium crimson, sodium yellow, potassium lilac, calcium orange-red, copper green.',
      }),
      recall({
        seconds: 140,
        stem: 'Describe how to carry out a flame test on a solid metal compound.',
        lines: 7,
        points: [
          point('Clean a wire loop by dipping it in hydrochloric acid and heating it in the flame', {
            allow: ['use a clean nichrome or platinum wire', 'use a wooden splint soaked in water'],
          }),
          point('Dip the loop in the solid', { allow: ['dip the loop in a solution of the solid'] }),
          point('Hold it in a blue Bunsen burner flame', {
            allow: ['roaring flame', 'non-luminous flame'],
            reject: ['yellow flame', 'safety flame'],
          }),
          point('Observe the colour of the flame'),
        ],
        model:
          'Dip a nichrome wire loop in hydrochloric acid and heat it in the flame until it gives no colour. Dip the clean loop in the solid, hold it in the edge of a blue Bunsen burner flame and observe the colour.',
      }),
      shortParts({
        seconds: 100,
        stem: 'Sodium hydroxide solution is added to three solutions. State the colour of the precipitate that forms with each ion.',
        parts: [
          part({
            prompt: r`$\text{Cu}^{2+}$`,
            answer: words(
              'blue',
              'blue precipitate',
              'pale blue',
              'light blue',
              'bright blue',
              'deep blue',
              'dark blue',
              'sky blue',
            ),
            model: 'blue',
            points: ['blue'],
          }),
          part({
            prompt: r`$\text{Fe}^{2+}$`,
            answer: words(
              'green',
              'green precipitate',
              'dark green',
              'pale green',
              'light green',
              'dirty green',
              'grey-green',
              'grey green',
              'green-grey',
            ),
            model: 'green',
            points: ['green'],
          }),
          part({
            prompt: r`$\text{Fe}^{3+}$`,
            answer: wording(
              'brown',
              'brown precipitate',
              'orange-brown',
              'orange brown',
              'brown-orange',
              'red-brown',
              'red brown',
              'reddish brown',
              'reddish-brown',
              'rust',
              'rusty brown',
              'rust brown',
            ),
            model: 'brown',
            points: [point('brown', { allow: ['orange-brown', 'red-brown'] })],
          }),
        ],
      }),
      recall({
        seconds: 110,
        stem: 'Solution A contains magnesium ions and solution B contains aluminium ions. Describe how sodium hydroxide solution can be used to tell them apart.',
        lines: 6,
        points: [
          point('Add a few drops of sodium hydroxide solution: both give a white precipitate'),
          point('Add excess sodium hydroxide solution: the precipitate from B (aluminium) dissolves', {
            allow: ['B becomes a colourless solution'],
          }),
          point('The precipitate from A (magnesium) does not dissolve', { allow: ['no change with A'] }),
        ],
        model:
          'Add sodium hydroxide solution a little at a time to each. Both give a white precipitate. In excess sodium hydroxide solution the precipitate in B, from aluminium ions, dissolves, but the precipitate in A, from magnesium ions, does not.',
        guidance:
          'The first result is the same for both; the difference is seen only in excess. Say what happens to each.',
      }),
      shortParts({
        seconds: 110,
        stem: 'Solutions of three salts are tested. Name the negative ion shown to be present by each result.',
        guidance:
          'Barium chloride tests for sulfate. With silver nitrate, chloride is white, bromide cream and iodide yellow.',
        parts: [
          part({
            prompt: 'A white precipitate forms with dilute hydrochloric acid and barium chloride solution.',
            answer: exactly(
              [
                'sulfate',
                'sulphate',
                'sulfate ion',
                'sulfate ions',
                'sulphate ion',
                'sulphate ions',
                'SO4 2-',
                'SO42-',
                'SO4^2-',
              ],
              [
                'sulfide',
                'sulphide',
                'sulfite',
                'sulphite',
                'sulfite ion',
                'sulfite ions',
                'sulfide ion',
                'sulfide ions',
              ],
            ),
            model: 'sulfate',
            points: [point('sulfate', { allow: ['SO₄²⁻'], reject: ['sulfide', 'sulfite'] })],
          }),
          part({
            prompt: 'A cream precipitate forms with dilute nitric acid and silver nitrate solution.',
            answer: exactly(
              ['bromide', 'bromide ion', 'bromide ions', 'Br-', 'Br^-'],
              ['bromine', 'bromine ion', 'bromine ions'],
            ),
            model: 'bromide',
            points: [point('bromide', { allow: ['Br⁻'], reject: ['bromine'] })],
          }),
          part({
            prompt: 'A white precipitate forms with dilute nitric acid and silver nitrate solution.',
            answer: exactly(
              ['chloride', 'chloride ion', 'chloride ions', 'Cl-', 'Cl^-'],
              ['chlorine', 'chlorine ion', 'chlorine ions'],
            ),
            model: 'chloride',
            points: [point('chloride', { allow: ['Cl⁻'], reject: ['chlorine'] })],
          }),
        ],
      }),
      recall({
        seconds: 110,
        stem: 'Describe a test to show that a white solid contains carbonate ions. Include the results.',
        lines: 5,
        points: [
          point('Add dilute acid to the solid', { allow: ['a named dilute acid'] }),
          point('Fizzing is seen and the gas is passed into limewater', {
            allow: ['bubble the gas through limewater', 'collect the gas and shake it with limewater'],
          }),
          point('The limewater turns milky, so the gas is carbon dioxide', { allow: ['cloudy', 'white precipitate'] }),
        ],
        model:
          'Add dilute hydrochloric acid to the solid. It fizzes. Bubble the gas through limewater, which turns milky because the gas is carbon dioxide.',
        guidance: 'Fizzing alone does not identify the gas. The limewater result is the evidence.',
      }),
      short({
        seconds: 80,
        stem: 'A white solid gives a lilac flame. A solution of the solid gives a yellow precipitate with dilute nitric acid and silver nitrate solution. Name the compound.',
        lines: 1,
        answer: wording('potassium iodide', 'KI'),
        model: 'potassium iodide',
        points: [
          point('potassium, from the lilac flame', { allow: ['K⁺'] }),
          point('iodide, from the yellow precipitate', { allow: ['I⁻'], reject: ['iodine'] }),
        ],
      }),
      short({
        seconds: 90,
        stem: r`In flame emission spectroscopy, the reading for sodium ions is directly proportional to their concentration. A standard solution containing $24\ \text{mg/dm}^3$ of sodium ions gives a reading of $0.60$. A sample of mineral water gives a reading of $0.45$. Calculate the concentration of sodium ions in the mineral water.`,
        lines: 3,
        answerLabel: 'Concentration =',
        answer: num(18, { unit: 'mg/dm³' }),
        recompute: () => (0.45 / 0.6) * 24,
        model: '18',
        points: [r`$\dfrac{0.45}{0.60} \times 24$`, r`$18\ (\text{mg/dm}^3)$`],
      }),
    ],
  },
  {
    number: '10',
    title: 'The atmosphere and Earth’s resources',
    weights: { 2: 28 },
    questions: [
      shortParts({
        seconds: 60,
        stem: 'Give the approximate percentage of each gas in dry air today.',
        parts: [
          part({
            prompt: 'Nitrogen',
            answer: num(78, { range: { min: 78, max: 80 }, unit: '%' }),
            answerLabel: 'Nitrogen =',
            model: '78',
            points: [point(r`$78\ (\%)$`, { allow: ['about 80%'] })],
          }),
          part({
            prompt: 'Oxygen',
            answer: num(21, { range: { min: 20, max: 21 }, unit: '%' }),
            answerLabel: 'Oxygen =',
            model: '21',
            points: [point(r`$21\ (\%)$`, { allow: ['about 20%'] })],
          }),
        ],
      }),
      recall({
        seconds: 160,
        stem: 'Explain how the amount of carbon dioxide in the Earth’s early atmosphere decreased.',
        lines: 8,
        points: [
          point('Water vapour condensed to form oceans'),
          point('Carbon dioxide dissolved in the oceans'),
          point('Carbonates were precipitated, forming sediments', {
            allow: ['carbon was locked up in sedimentary rocks or in shells'],
          }),
          point('Algae and plants took in carbon dioxide for photosynthesis', {
            allow: ['carbon from them was locked up in fossil fuels'],
          }),
        ],
        model:
          'Water vapour condensed to form the oceans and carbon dioxide dissolved in them. Carbonates were precipitated and formed sediments. Algae, and later plants, used carbon dioxide in photosynthesis.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain how greenhouse gases keep the Earth warm. Refer to the wavelength of radiation.',
        lines: 8,
        points: [
          point('Short-wavelength radiation from the Sun passes through the atmosphere to the Earth’s surface', {
            reject: ['is trapped by the ozone layer'],
          }),
          point('The surface warms and gives out radiation of a longer wavelength', {
            allow: ['emits infrared radiation'],
          }),
          point('Greenhouse gases absorb the longer-wavelength radiation', { reject: ['reflect'] }),
          point('They give out radiation in all directions, some of it back towards the surface', {
            allow: ['energy is kept in the atmosphere'],
          }),
        ],
        model:
          'Short-wavelength radiation from the Sun passes through the atmosphere and warms the surface. The surface emits infrared radiation, which has a longer wavelength. Greenhouse gases absorb this radiation and re-emit it in all directions, so some returns to the surface and keeps it warm.',
        guidance:
          'Greenhouse gases absorb and re-emit radiation. Answers that say they reflect it, or that bring in the ozone layer, lose marks.',
      }),
      short({
        seconds: 40,
        stem: 'Name the toxic, colourless gas formed when a hydrocarbon fuel burns in a limited supply of oxygen.',
        answer: words('carbon monoxide', 'CO', 'carbon monoxide gas'),
        model: 'carbon monoxide',
        points: [point('carbon monoxide', { allow: ['CO'], reject: ['carbon dioxide'] })],
      }),
      short({
        seconds: 85,
        stem: r`The mean concentration of carbon dioxide in the atmosphere was about $317$ parts per million in 1960 and about $414$ parts per million in 2020. Calculate the percentage increase. Give your answer to 3 significant figures.`,
        lines: 3,
        answerLabel: 'Percentage increase =',
        answer: num(30.6, { tolerance: 0.05, unit: '%' }),
        recompute: () => ((414 - 317) / 317) * 100,
        model: '30.6',
        points: [r`$\dfrac{414 - 317}{317} \times 100$`, r`$30.6\ (\%)$`],
        guidance: 'Divide the increase by the starting value. Dividing by 414 gives 23.4%.',
      }),
      recall({
        seconds: 140,
        stem: 'Describe and explain how fresh water from a river is treated to make it safe to drink.',
        lines: 7,
        points: [
          point('The water is passed through filter beds', { allow: ['filtered', 'sedimentation then filtration'] }),
          point('To remove insoluble solids', { allow: ['particles', 'grit'], reject: ['to remove dissolved salts'] }),
          point('It is sterilised with chlorine, ozone or ultraviolet light', { allow: ['chlorinated'] }),
          point('To kill microorganisms', { allow: ['kill bacteria', 'kill pathogens'] }),
        ],
        model:
          'The water is passed through filter beds to remove insoluble solids. It is then sterilised, using chlorine, ozone or ultraviolet light, to kill harmful microorganisms.',
        guidance: 'Each step needs its purpose: filtering removes solids, sterilising kills microorganisms.',
      }),
      short({
        seconds: 45,
        stem: 'Drinking water can be made from sea water by forcing it at high pressure through a membrane that holds back the dissolved salts. Name this process.',
        answer: words('reverse osmosis', 'by reverse osmosis', 'RO'),
        model: 'reverse osmosis',
        points: [point('reverse osmosis', { ignore: ['desalination'], reject: ['osmosis', 'distillation'] })],
      }),
      recall({
        seconds: 160,
        tier: 'higher',
        stem: 'Describe how copper is obtained from low-grade ores by phytomining.',
        lines: 8,
        points: [
          point('Plants are grown on land that contains copper compounds and absorb these through their roots', {
            reject: ['plants absorb copper ore or copper metal'],
          }),
          point('The plants are harvested and burned'),
          point('The ash contains copper compounds'),
          point(
            'The copper compounds are dissolved in acid, and copper is obtained by displacement with scrap iron or by electrolysis',
          ),
        ],
        model:
          'Plants are grown on land containing copper compounds, which they absorb through their roots. The plants are harvested and burned. The ash contains copper compounds, which are dissolved in acid. Copper is then obtained from the solution by electrolysis or by displacement using scrap iron.',
      }),
      short({
        seconds: 85,
        stem: r`In one life cycle assessment, making $1\ \text{kg}$ of aluminium from its ore takes $210\ \text{MJ}$ of energy. Making $1\ \text{kg}$ of aluminium by recycling takes $11\ \text{MJ}$. Calculate the percentage of energy saved by recycling. Give your answer to 3 significant figures.`,
        lines: 3,
        answerLabel: 'Energy saved =',
        answer: num(94.8, { tolerance: 0.05, unit: '%' }),
        recompute: () => ((210 - 11) / 210) * 100,
        model: '94.8',
        points: [r`$\dfrac{210 - 11}{210} \times 100$`, r`$94.8\ (\%)$`],
      }),
      recall({
        seconds: 140,
        stem: 'A life cycle assessment looks at the effect of a product on the environment. State the four main stages of the product’s life that it covers.',
        lines: 5,
        points: [
          point('Extracting and processing raw materials', { allow: ['obtaining raw materials'] }),
          point('Manufacturing and packaging the product', { allow: ['making the product'] }),
          point('Using the product during its lifetime', { allow: ['maintaining the product'] }),
          point('Disposing of the product at the end of its life', {
            allow: ['recycling or landfill'],
            ignore: ['transport'],
          }),
        ],
        model:
          'It covers extracting and processing the raw materials, manufacturing and packaging the product, using the product during its lifetime, and disposing of it at the end of its useful life.',
      }),
    ],
  },
];
