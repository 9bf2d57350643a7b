import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 1: circulation, infection, photosynthesis and respiration. */
export const bodyInfectionAndEnergy: TopicContent[] = [
  {
    number: '4',
    title: 'Heart, blood and lungs',
    weights: { 1: 16 },
    questions: [
      short({
        stem: r`A person at rest has a heart rate of 72 beats per minute. With each beat the left ventricle pumps out $75\ \text{cm}^3$ of blood.

$$\text{cardiac output} = \text{heart rate} \times \text{stroke volume}$$

Calculate the cardiac output. Give your answer in $\text{dm}^3\text{/min}$.`,
        seconds: 110,
        lines: 4,
        answerLabel: 'Cardiac output =',
        answer: num(5.4, { unit: 'dm³/min' }),
        recompute: () => (72 * 75) / 1000,
        model: '5.4',
        points: [
          r`Substitutes: $72 \times 75$`,
          r`$= 5400$ ($\text{cm}^3\text{/min}$)`,
          point(r`5.4 ($\text{dm}^3\text{/min}$)`, { allow: ['their value correctly divided by 1000'] }),
        ],
        guidance: r`$1\ \text{dm}^3 = 1000\ \text{cm}^3$.`,
      }),
      short({
        stem: r`In 6 minutes, $1.8\ \text{dm}^3$ of blood flows through an artery.

Calculate the mean rate of blood flow in $\text{cm}^3\text{/min}$.`,
        seconds: 80,
        lines: 3,
        answerLabel: 'Rate of blood flow =',
        answer: num(300, { unit: 'cm³/min' }),
        recompute: () => (1.8 * 1000) / 6,
        model: '300',
        points: [
          r`Converts $1.8\ \text{dm}^3$ to $1800\ \text{cm}^3$`,
          r`$\dfrac{1800}{6} = 300$ ($\text{cm}^3\text{/min}$)`,
        ],
        guidance: r`The answer is in $\text{cm}^3$, so multiply the $\text{dm}^3$ by 1000 before dividing by the time.`,
      }),
      shortParts({
        stem: 'Blood is carried to and from the heart by several large vessels.',
        seconds: 70,
        parts: [
          part({
            prompt: 'Name the blood vessel that carries blood from the lungs to the heart.',
            answer: words('pulmonary vein', 'pulmonary veins'),
            model: 'Pulmonary vein',
            points: [point('Pulmonary vein', { reject: ['pulmonary artery', 'vena cava', 'vein alone'] })],
          }),
          part({
            prompt: 'Name the blood vessel that carries blood from the left ventricle to the body.',
            answer: words('aorta'),
            model: 'Aorta',
            points: [point('Aorta', { reject: ['vena cava', 'artery alone'] })],
          }),
        ],
        guidance:
          'Arteries carry blood away from the heart and veins carry it back. "Pulmonary" means to do with the lungs.',
      }),
      shortParts({
        stem: 'Blood contains several components.',
        seconds: 70,
        parts: [
          part({
            prompt: 'Name the component, made of fragments of cells, that helps blood to clot at a wound.',
            answer: words('platelets', 'platelet', 'thrombocytes'),
            model: 'Platelets',
            points: [point('Platelets', { reject: ['plasma'] })],
          }),
          part({
            prompt: 'Name the red substance in red blood cells that combines with oxygen.',
            answer: words('haemoglobin', 'hemoglobin', 'Hb'),
            model: 'Haemoglobin',
            points: [point('Haemoglobin', { ignore: ['iron'] })],
          }),
        ],
      }),
      short({
        stem: 'State the function of the valves in veins.',
        seconds: 45,
        lines: 2,
        answer: wording(
          'to prevent the backflow of blood',
          'prevent backflow of blood',
          'to prevent backflow',
          'prevent backflow',
          'prevents backflow',
          'they prevent backflow',
          'stop blood flowing backwards',
          'to stop blood flowing backwards',
          'to stop the blood flowing backwards',
          'to stop the backflow of blood',
          'stop backflow',
          'to keep blood flowing in one direction',
          'keep blood flowing towards the heart',
          'to keep blood flowing towards the heart',
        ),
        model: 'to prevent the backflow of blood',
        points: [
          point('Prevent the backflow of blood', {
            allow: ['keep blood flowing towards the heart'],
            reject: ['pump the blood', 'control the speed of the blood'],
          }),
        ],
      }),
      recall({
        stem: 'Explain how the structure of an artery and the structure of a vein are each related to the pressure of the blood inside them.',
        seconds: 150,
        lines: 8,
        points: [
          'Blood in arteries is at high pressure, and blood in veins is at low pressure',
          point('An artery has a thick wall of muscle and elastic tissue', { reject: ['thick cell walls'] }),
          point('So that it can withstand the high pressure, or stretch and recoil with each beat', {
            allow: ['so that it does not burst'],
          }),
          point('A vein has a thinner wall and a wide lumen, or has valves to prevent backflow at low pressure', {
            allow: ['wide lumen gives little resistance to flow'],
          }),
        ],
        model:
          'Blood in arteries is at high pressure, so an artery has a thick wall of muscle and elastic tissue, which withstands the pressure and stretches and recoils with each beat. Blood in veins is at low pressure, so a vein has a thinner wall, a wide lumen and valves that prevent backflow.',
      }),
      recall({
        stem: 'Explain **three** ways in which the alveoli of the lungs are adapted for gas exchange.',
        seconds: 120,
        lines: 6,
        points: [
          point('There are very many of them, which gives a large surface area', {
            allow: ['their shape gives a large surface area'],
          }),
          point('Their walls are very thin (one cell thick), so the diffusion distance is short', {
            reject: ['thin cell walls'],
          }),
          point('They have a good blood supply (or are ventilated), which keeps a steep concentration gradient', {
            ignore: ['they are moist'],
          }),
        ],
        model:
          'There are very many alveoli, which gives a large surface area. Their walls are only one cell thick, so the diffusion distance is short. They are surrounded by capillaries, and the flow of blood keeps the concentration gradient steep.',
      }),
      recall({
        stem: 'Explain how coronary heart disease can damage the muscle of the heart, and how a stent is used to treat it.',
        seconds: 170,
        lines: 8,
        points: [
          'Fatty material builds up in the coronary arteries and narrows them',
          point('So less oxygen reaches the heart muscle', {
            allow: ['less blood carrying oxygen or glucose'],
            reject: ['no blood reaches the heart'],
          }),
          point('So the muscle cells cannot respire enough, and may die', {
            allow: ['less aerobic respiration', 'a heart attack happens'],
          }),
          point('A stent is put in the artery to hold it open, so that blood flows freely again', {
            reject: ['a stent removes the fat', 'a stent is put in a vein'],
          }),
        ],
        model:
          'Fatty material builds up inside the coronary arteries and narrows them. Less blood flows through, so less oxygen reaches the heart muscle. The muscle cells cannot respire enough and may die. A stent is placed in the narrowed artery to hold it open so that blood can flow freely again.',
        guidance: 'Name the coronary arteries and follow the chain: less blood, less oxygen, less respiration.',
      }),
    ],
  },
  {
    number: '5',
    title: 'Infection and response',
    weights: { 1: 16 },
    questions: [
      shortParts({
        stem: 'Pathogens are microorganisms that cause infectious disease.',
        seconds: 100,
        parts: [
          part({
            prompt: 'Name the type of pathogen that causes measles.',
            answer: words('virus', 'viruses', 'viral', 'a virus', 'measles virus'),
            model: 'Virus',
            points: [point('Virus', { reject: ['bacteria'] })],
          }),
          part({
            prompt: 'Name the type of pathogen that causes malaria.',
            answer: words(
              'protist',
              'protists',
              'protoctist',
              'protoctista',
              'protozoan',
              'protozoa',
              'protozoon',
              'protista',
              'plasmodium',
            ),
            model: 'Protist',
            points: [
              point('Protist', { allow: ['protoctist', 'Plasmodium'], reject: ['mosquito', 'parasite', 'virus'] }),
            ],
          }),
          part({
            prompt: 'Name the type of pathogen that causes food poisoning by *Salmonella*.',
            answer: words('bacteria', 'bacterium', 'bacterial'),
            model: 'Bacteria',
            points: [point('Bacteria', { reject: ['virus'] })],
          }),
        ],
        guidance: 'A mosquito carries the malaria protist from person to person. It is the vector, not the pathogen.',
      }),
      short({
        stem: 'In a trial of a vaccine, 240 people were given the vaccine and 240 people were given an injection with no vaccine in it. In the vaccine group 6 people caught the disease. In the other group 60 people caught it.\n\nCalculate the percentage by which the vaccine reduced the number of people who caught the disease.',
        seconds: 120,
        lines: 4,
        answerLabel: 'Percentage reduction =',
        answer: num(90, { unit: '%' }),
        recompute: () => ((60 - 6) / 60) * 100,
        model: '90',
        points: [r`Difference $= 60 - 6 = 54$`, r`$\dfrac{54}{60} \times 100$`, '90 (%)'],
        guidance: 'Divide by the number who caught it without the vaccine, 60, and not by the size of the group.',
      }),
      short({
        stem: 'In a clinical trial of a new medicine, some patients are given tablets that look the same but contain none of the medicine.\n\nName this type of tablet.',
        seconds: 40,
        answer: words('placebo', 'placebos', 'a placebo', 'placebo tablet', 'placebo tablets'),
        model: 'Placebo',
        points: [point('Placebo', { ignore: ['control'] })],
      }),
      short({
        stem: 'Name the plant that is the original source of the heart drug digitalis.',
        seconds: 30,
        answer: words('foxglove', 'foxgloves', 'foxglove plant', 'fox glove', 'fox gloves', 'digitalis purpurea'),
        model: 'Foxglove',
        points: [point('Foxglove(s)', { reject: ['willow'] })],
      }),
      short({
        stem: 'Name the type of chemical made by white blood cells that joins to the antigens of one particular pathogen.',
        seconds: 40,
        answer: words('antibodies', 'antibody', 'immunoglobulins', 'immunoglobulin'),
        model: 'Antibodies',
        points: [point('Antibodies', { reject: ['antibiotics', 'antigens', 'antitoxins'] })],
      }),
      recall({
        stem: 'Explain how vaccination can stop a person becoming ill if the pathogen enters the body later.',
        seconds: 170,
        lines: 8,
        points: [
          point('The vaccine contains dead, inactive or weakened forms of the pathogen', {
            allow: ['antigens from the pathogen'],
            reject: ['a small amount of the disease', 'it contains antibodies'],
          }),
          'White blood cells make antibodies to it',
          point('If the same pathogen enters again, white blood cells respond quickly', {
            allow: ['memory cells recognise the antigen'],
          }),
          point('They make many antibodies, so the pathogen is destroyed before the person becomes ill', {
            allow: ['antibodies are made faster and in larger numbers'],
          }),
        ],
        model:
          'The vaccine contains dead or inactive forms of the pathogen. White blood cells respond by making antibodies. If the same pathogen enters the body later, the white blood cells recognise it and quickly make large numbers of the correct antibody, so it is destroyed before the person becomes ill.',
        guidance: 'White blood cells make antibodies. The vaccine does not contain them.',
      }),
      recall({
        stem: 'Describe **three** ways in which white blood cells protect the body against pathogens.',
        seconds: 100,
        lines: 5,
        points: [
          point('They engulf and digest pathogens', { allow: ['phagocytosis'], reject: ['eat the disease'] }),
          point('They make antibodies (which help to destroy particular pathogens)', { reject: ['antibiotics'] }),
          point('They make antitoxins, which neutralise toxins made by pathogens', {
            reject: ['antitoxins kill pathogens'],
          }),
        ],
        model:
          'White blood cells engulf and digest pathogens. They make antibodies, which help to destroy particular pathogens. They make antitoxins, which neutralise the toxins made by pathogens.',
        guidance: 'Antibodies act on pathogens; antitoxins act on the toxins that pathogens make.',
      }),
      recall({
        stem: 'A person with influenza, which is caused by a virus, asks for antibiotics.\n\nExplain why a doctor would not prescribe antibiotics for influenza.',
        seconds: 110,
        lines: 6,
        points: [
          'Antibiotics kill bacteria but do not kill viruses',
          point('Viruses live and reproduce inside body cells', {
            allow: ['drugs that kill viruses would damage body cells'],
          }),
          point('Overuse of antibiotics leads to more resistant strains of bacteria', {
            allow: ['bacteria becoming resistant'],
            reject: ['the person becomes resistant', 'bacteria become immune'],
          }),
        ],
        model:
          'Antibiotics kill bacteria but have no effect on viruses, which live and reproduce inside body cells. Using antibiotics when they are not needed also increases the number of resistant strains of bacteria.',
        guidance: 'Bacteria become resistant to antibiotics. People do not.',
      }),
    ],
  },
  {
    number: '6',
    title: 'Photosynthesis and respiration',
    weights: { 1: 16 },
    questions: [
      short({
        stem: 'Write the word equation for photosynthesis.',
        seconds: 70,
        lines: 2,
        answer: wording(
          'carbon dioxide + water → glucose + oxygen',
          'water + carbon dioxide → glucose + oxygen',
          'carbon dioxide + water → oxygen + glucose',
          'water + carbon dioxide → oxygen + glucose',
          'carbon dioxide + water -> glucose + oxygen',
          'water + carbon dioxide -> glucose + oxygen',
          'carbon dioxide + water -> oxygen + glucose',
          'water + carbon dioxide -> oxygen + glucose',
          'carbon dioxide + water = glucose + oxygen',
          'water + carbon dioxide = glucose + oxygen',
          'carbon dioxide + water --> glucose + oxygen',
          'carbon dioxide + water makes glucose + oxygen',
        ),
        model: 'carbon dioxide + water → glucose + oxygen',
        points: [
          point('Carbon dioxide + water on the left', {
            ignore: ['light or energy written over the arrow'],
            reject: ['light or energy written as a reactant'],
          }),
          point('Glucose + oxygen on the right', { allow: ['sugar for glucose'] }),
        ],
        guidance: 'Light is needed but it is not a substance, so it goes over the arrow or is left out.',
      }),
      short({
        stem: r`A piece of pondweed releases $4.5\ \text{cm}^3$ of gas in 15 minutes.

Calculate the mean rate at which gas is released.`,
        seconds: 70,
        lines: 3,
        answerLabel: 'Mean rate =',
        answer: num(0.3, { unit: 'cm³/min' }),
        recompute: () => 4.5 / 15,
        model: '0.30',
        points: [r`$\text{Rate} = \dfrac{4.5}{15}$`, r`0.30 ($\text{cm}^3\text{/min}$)`],
      }),
      short({
        stem: r`The light intensity on a leaf 10 cm from a small lamp is 400 arbitrary units.

$$\text{light intensity} \propto \dfrac{1}{\text{distance}^2}$$

Calculate the light intensity 25 cm from the lamp, in the same arbitrary units.`,
        tier: 'higher',
        seconds: 120,
        lines: 4,
        answerLabel: 'Light intensity =',
        answer: num(64, { unit: 'arbitrary units' }),
        recompute: () => 400 * (10 / 25) ** 2,
        model: '64',
        points: [
          r`The distance is 2.5 times as great`,
          point(r`Divides by the square: $\dfrac{400}{2.5^2}$`, { allow: ['400 × 10² ÷ 25²'] }),
          '64 (arbitrary units)',
        ],
        guidance:
          'Light intensity follows the inverse square law, so a distance 2.5 times as great gives an intensity 6.25 times smaller.',
      }),
      shortParts({
        stem: 'Anaerobic respiration takes place when cells do not have enough oxygen.',
        seconds: 90,
        parts: [
          part({
            prompt: 'Name the product of anaerobic respiration in human muscle cells.',
            answer: exactly(
              ['lactic acid', 'lactate', 'lacticacid'],
              ['lactase', 'lactose', 'ethanol', 'carbon dioxide'],
            ),
            model: 'Lactic acid',
            points: [point('Lactic acid', { allow: ['lactate'], reject: ['carbon dioxide', 'ethanol'] })],
          }),
          part({
            prompt: 'Name **two** products of anaerobic respiration in yeast cells.',
            lines: 2,
            answer: wording(
              'ethanol and carbon dioxide',
              'carbon dioxide and ethanol',
              'ethanol, carbon dioxide',
              'carbon dioxide, ethanol',
              'ethanol + carbon dioxide',
              'carbon dioxide + ethanol',
              'alcohol and carbon dioxide',
              'carbon dioxide and alcohol',
              'ethanol and CO2',
              'CO2 and ethanol',
              'ethanol, CO2',
              'CO2, ethanol',
              'ethanol & carbon dioxide',
              'carbon dioxide & ethanol',
              'ethanol and CO₂',
              'CO₂ and ethanol',
              'alcohol, carbon dioxide',
            ),
            model: 'ethanol and carbon dioxide',
            points: [point('Ethanol', { allow: ['alcohol'] }), 'Carbon dioxide'],
          }),
        ],
      }),
      short({
        stem: 'Before exercise a student takes 15 breaths per minute. Straight after exercise she takes 24 breaths per minute.\n\nCalculate the percentage increase in her breathing rate.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Percentage increase =',
        answer: num(60, { unit: '%' }),
        recompute: () => ((24 - 15) / 15) * 100,
        model: '60',
        points: [r`$\dfrac{24 - 15}{15} \times 100$`, '60 (%)'],
        guidance: 'Divide the increase by the rate **before** exercise, and multiply by 100.',
      }),
      recall({
        stem: 'A grower raises the concentration of carbon dioxide in a glasshouse. At first the rate of photosynthesis increases, but above a certain concentration it stays the same.\n\nExplain these results.',
        seconds: 120,
        lines: 6,
        points: [
          point('At first carbon dioxide is the limiting factor', {
            allow: ['there is not enough carbon dioxide at low concentrations'],
          }),
          point('Carbon dioxide is a reactant, so more of it makes photosynthesis faster', {
            allow: ['it is needed to make glucose'],
          }),
          point('Above a certain concentration another factor, such as light intensity or temperature, is limiting', {
            allow: ['amount of chlorophyll'],
            reject: ['carbon dioxide runs out', 'photosynthesis stops'],
          }),
        ],
        model:
          'At low concentrations carbon dioxide is the limiting factor. It is a reactant in photosynthesis, so raising its concentration makes the rate increase. Above a certain concentration another factor, such as light intensity or temperature, limits the rate, so it stays the same.',
      }),
      recall({
        stem: 'Compare aerobic respiration with anaerobic respiration in human muscle cells.',
        seconds: 150,
        lines: 7,
        points: [
          point('Both use glucose and transfer energy', {
            allow: ['both release energy', 'both are exothermic'],
            reject: ['energy is made'],
          }),
          'Aerobic respiration uses oxygen and anaerobic respiration does not',
          'Aerobic respiration produces carbon dioxide and water, and anaerobic respiration produces lactic acid',
          point('Aerobic respiration transfers much more energy from each glucose molecule', {
            allow: ['anaerobic transfers less, because glucose is not completely broken down'],
          }),
        ],
        model:
          'Both use glucose and transfer energy. Aerobic respiration uses oxygen and produces carbon dioxide and water. Anaerobic respiration does not use oxygen and produces lactic acid. Aerobic respiration transfers much more energy from each glucose molecule.',
        guidance: 'Write about both in each sentence. "It uses oxygen" alone does not say what the other does.',
      }),
      recall({
        stem: 'After hard exercise a runner goes on breathing deeply for several minutes.\n\nExplain why, using the idea of an oxygen debt.',
        tier: 'higher',
        seconds: 120,
        lines: 6,
        points: [
          point('Lactic acid built up in the muscles during anaerobic respiration', { allow: ['lactate'] }),
          point('Blood carries the lactic acid to the liver, where it is converted back into glucose', {
            allow: ['lactic acid is broken down or oxidised'],
          }),
          point('Extra oxygen is needed for this, which is the oxygen debt', {
            allow: ['oxygen debt is the extra oxygen needed to react with the lactic acid'],
          }),
        ],
        model:
          'During hard exercise the muscles respired anaerobically and lactic acid built up. The blood carries it to the liver, where it is converted back into glucose. The extra oxygen needed to deal with the lactic acid is the oxygen debt, so the runner goes on breathing deeply to take it in.',
      }),
      recall({
        stem: 'State **five** ways in which a plant uses the glucose made in photosynthesis.',
        seconds: 140,
        lines: 6,
        points: [
          point('For respiration', { allow: ['to release energy'], reject: ['to make energy'] }),
          'To make starch (for storage)',
          point('To make fats or oils (for storage)', { allow: ['lipids'] }),
          point('To make cellulose (for cell walls)', { allow: ['to strengthen cell walls, with cellulose named'] }),
          point('With nitrate ions, to make amino acids (and proteins)', { allow: ['to make proteins'] }),
        ],
        model:
          'Glucose is used in respiration, converted into starch for storage, converted into fats or oils for storage, used to make cellulose for cell walls, and combined with nitrate ions to make amino acids for proteins.',
      }),
    ],
  },
];
