import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 1: cells, enzymes and digestion. */
export const cellsAndDigestion: TopicContent[] = [
  {
    number: '1',
    title: 'Cell structure and microscopy',
    weights: { 1: 18 },
    questions: [
      short({
        stem: 'In a photograph taken through a microscope, a cell is 48 mm long. The real length of the cell is 0.060 mm.\n\nCalculate the magnification of the photograph.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Magnification = ×',
        answer: num(800),
        recompute: () => 48 / 0.06,
        model: '800',
        points: [
          r`Substitutes: $\text{magnification} = \dfrac{48}{0.060}$`,
          point('(×) 800', { ignore: ['a unit after the number'] }),
        ],
        guidance: r`$\text{magnification} = \dfrac{\text{size of image}}{\text{size of real object}}$. Both sizes must be in the same unit, and magnification has no unit.`,
      }),
      short({
        stem: r`A red blood cell is drawn at a magnification of $\times 5000$. In the drawing its diameter is 38 mm.

Calculate the real diameter of the cell. Give your answer in micrometres (μm).`,
        seconds: 120,
        lines: 4,
        answerLabel: 'Diameter =',
        answer: num(7.6, { unit: 'μm' }),
        recompute: () => (38 / 5000) * 1000,
        model: '7.6',
        points: [
          r`Rearranges: $\text{real size} = \dfrac{38}{5000}$`,
          r`$= 0.0076$ (mm)`,
          point('7.6 (μm)', { allow: ['their size in millimetres correctly multiplied by 1000'] }),
        ],
        guidance:
          '1 mm = 1000 μm. A red blood cell is a few micrometres across, so an answer in the thousands has been converted the wrong way.',
      }),
      shortParts({
        stem: 'A mitochondrion is 0.0025 mm long.',
        seconds: 110,
        parts: [
          part({
            prompt: 'Give this length in micrometres (μm).',
            answerLabel: 'Length =',
            answer: num(2.5, { unit: 'μm' }),
            recompute: () => 0.0025 * 1000,
            model: '2.5',
            points: ['2.5 (μm)'],
          }),
          part({
            prompt: r`Calculate the length of the image, in millimetres, at a magnification of $\times 20\,000$.`,
            lines: 3,
            answerLabel: 'Length of image =',
            answer: num(50, { unit: 'mm' }),
            recompute: () => 0.0025 * 20000,
            model: '50',
            points: [r`Rearranges: $\text{size of image} = 20\,000 \times 0.0025$`, '50 (mm)'],
          }),
        ],
      }),
      shortParts({
        stem: 'A cell from a leaf contains several sub-cellular structures.',
        seconds: 75,
        parts: [
          part({
            prompt: 'Name the structure where most of the reactions of aerobic respiration take place.',
            answer: words('mitochondria', 'mitochondrion'),
            model: 'Mitochondria',
            points: [point('Mitochondria', { reject: ['chloroplast', 'ribosome'] })],
          }),
          part({
            prompt: 'Name the structure where proteins are made.',
            answer: words('ribosomes', 'ribosome'),
            model: 'Ribosomes',
            points: [point('Ribosome(s)', { reject: ['nucleus'] })],
          }),
          part({
            prompt: 'Name the structure that contains the genetic material controlling the activities of the cell.',
            answer: words('nucleus', 'cell nucleus', 'nuclei'),
            model: 'Nucleus',
            points: ['Nucleus'],
          }),
        ],
        guidance:
          'Chloroplasts carry out photosynthesis. Respiration in a leaf cell still takes place in the mitochondria.',
      }),
      short({
        stem: 'Name the substance that strengthens the cell wall of a plant cell.',
        seconds: 30,
        answer: exactly(['cellulose'], ['cellulase']),
        model: 'Cellulose',
        points: [point('Cellulose', { reject: ['glucose', 'starch', 'chitin'] })],
      }),
      recall({
        stem: 'Describe how a bacterial cell differs from an animal cell in how its genetic material is held, in its outer layers and in its size.',
        seconds: 110,
        lines: 6,
        points: [
          point('Its DNA is not enclosed in a nucleus', {
            allow: ['a single loop of DNA is free in the cytoplasm', 'it has plasmids'],
          }),
          point('It has a cell wall outside the cell membrane', { reject: ['a cell wall of cellulose'] }),
          point('It is much smaller', { ignore: ['it has no mitochondria'] }),
        ],
        model:
          'In a bacterial cell the DNA is not enclosed in a nucleus but is a single loop in the cytoplasm. It has a cell wall outside its membrane, which an animal cell does not have. It is much smaller than an animal cell.',
      }),
      recall({
        stem: 'A student wants to look at onion cells with a light microscope.\n\nDescribe how to prepare a slide of onion cells.',
        seconds: 150,
        lines: 8,
        points: [
          point('Peel a thin layer of cells from the onion', {
            allow: ['a layer one cell thick'],
            ignore: ['cut a slice'],
          }),
          'Place it flat on a slide in a drop of water',
          point('Add a drop of iodine solution', { allow: ['add a stain', 'methylene blue'] }),
          point('Lower a cover slip at an angle, with a needle, so that no air bubbles are trapped', {
            allow: ['lower the cover slip slowly'],
          }),
        ],
        model:
          'Peel a thin layer of cells from the inside of an onion. Lay it flat on a slide in a drop of water. Add a drop of iodine solution to stain the cells. Lower a cover slip at an angle with a needle so that no air bubbles are trapped.',
        guidance: 'The layer must be thin so that light can pass through it, and the stain makes the nuclei show.',
      }),
    ],
  },
  {
    number: '2',
    title: 'Cell division and transport in cells',
    weights: { 1: 18 },
    questions: [
      short({
        stem: 'In a sample of 200 cells from the tip of a root, 24 cells are dividing by mitosis. The whole cell cycle takes 20 hours.\n\nEstimate how long mitosis takes. Give your answer in minutes.',
        seconds: 120,
        lines: 4,
        answerLabel: 'Time =',
        answer: num(144, { unit: 'minutes' }),
        recompute: () => (24 / 200) * 20 * 60,
        model: '144',
        points: [
          r`Uses the fraction of cells in mitosis: $\dfrac{24}{200} = 0.12$`,
          r`$0.12 \times 20 = 2.4$ (hours)`,
          point('144 (minutes)', { allow: ['their time in hours correctly multiplied by 60'] }),
        ],
        guidance: 'The fraction of cells seen in a stage is about the fraction of the cycle that the stage takes.',
      }),
      shortParts({
        stem: 'A cube of agar has sides 3 cm long.',
        seconds: 130,
        parts: [
          part({
            prompt: 'Calculate the surface area of the cube.',
            lines: 2,
            answerLabel: 'Surface area =',
            answer: num(54, { unit: 'cm²' }),
            recompute: () => 6 * 3 ** 2,
            model: '54',
            points: [r`54 ($\text{cm}^2$)`],
          }),
          part({
            prompt: 'Calculate the volume of the cube.',
            lines: 2,
            answerLabel: 'Volume =',
            answer: num(27, { unit: 'cm³' }),
            recompute: () => 3 ** 3,
            model: '27',
            points: [r`27 ($\text{cm}^3$)`],
          }),
          part({
            prompt: r`The surface area to volume ratio of the cube is $n : 1$. Give the value of $n$.`,
            answerLabel: 'n =',
            answer: num(2),
            recompute: () => (6 * 3 ** 2) / 3 ** 3,
            model: '2',
            lines: 2,
            points: [
              point(r`Divides the surface area by the volume: $54 \div 27$`, {
                allow: ['their surface area divided by their volume'],
              }),
              '2',
            ],
          }),
        ],
        guidance:
          'A cube has six faces. As a cube gets bigger, its surface area to volume ratio gets smaller, so diffusion alone is not enough.',
      }),
      short({
        stem: 'A piece of potato has a mass of 2.50 g. After one hour in a sugar solution its mass is 2.15 g.\n\nCalculate the percentage decrease in mass.',
        seconds: 80,
        lines: 3,
        answerLabel: 'Percentage decrease =',
        answer: num(14, { unit: '%' }),
        recompute: () => ((2.5 - 2.15) / 2.5) * 100,
        model: '14',
        points: [r`$\dfrac{2.50 - 2.15}{2.50} \times 100$`, '14 (%)'],
        guidance: r`Divide the change by the **original** mass. Dividing by 2.15 is the usual slip.`,
      }),
      short({
        stem: 'The concentration of nitrate ions is higher inside root hair cells than in the soil water.\n\nName the process by which root hair cells take in nitrate ions.',
        seconds: 40,
        answer: words('active transport', 'by active transport', 'active uptake'),
        model: 'Active transport',
        points: [point('Active transport', { reject: ['diffusion', 'osmosis'] })],
      }),
      shortParts({
        stem: 'The body cells of a cat contain 38 chromosomes.',
        seconds: 60,
        parts: [
          part({
            prompt:
              'Give the number of chromosomes in each new cell made when a skin cell of the cat divides by mitosis.',
            answerLabel: 'Number of chromosomes =',
            answer: num(38),
            model: '38',
            points: ['38'],
          }),
          part({
            prompt: 'Give the number of pairs of chromosomes in a body cell of the cat.',
            answerLabel: 'Number of pairs =',
            answer: num(19),
            recompute: () => 38 / 2,
            model: '19',
            points: ['19'],
          }),
        ],
      }),
      recall({
        stem: 'A cylinder of potato is left in a concentrated sugar solution. It becomes shorter and softer.\n\nExplain why.',
        seconds: 120,
        lines: 6,
        points: [
          point('Water moves out of the potato cells by osmosis', { reject: ['sugar moves out'] }),
          point('From a more dilute solution inside the cells to a more concentrated solution outside', {
            allow: ['from a higher to a lower water potential', 'from a high to a low concentration of water'],
          }),
          point('Through a partially permeable membrane', {
            allow: ['selectively permeable', 'semi-permeable'],
            reject: ['through the cell wall only'],
          }),
        ],
        model:
          'Water moves out of the potato cells by osmosis. It moves from the more dilute solution inside the cells to the more concentrated solution outside, through the partially permeable cell membranes, so the cells lose water and become flaccid.',
        guidance:
          'Name osmosis, give the direction in terms of concentration, and mention the partially permeable membrane.',
      }),
      recall({
        stem: 'Compare diffusion and active transport.',
        seconds: 140,
        lines: 7,
        points: [
          'Both move particles into or out of cells',
          point('Diffusion is from a higher to a lower concentration', { allow: ['down the concentration gradient'] }),
          point('Active transport is from a lower to a higher concentration', {
            allow: ['against the concentration gradient'],
          }),
          point('Active transport needs energy from respiration, and diffusion does not', {
            reject: ['diffusion needs energy', 'energy is made'],
          }),
        ],
        model:
          'Both move particles into or out of cells. In diffusion particles move from a higher to a lower concentration, down the concentration gradient. In active transport they move from a lower to a higher concentration, against the gradient. Active transport needs energy from respiration, but diffusion does not.',
        guidance: '"Compare" needs at least one similarity as well as the differences.',
      }),
      recall({
        stem: 'Stem cells from human embryos may be used to treat some diseases.\n\nState what a stem cell is. Give one possible benefit of using embryonic stem cells and one objection to it.',
        seconds: 130,
        lines: 6,
        points: [
          point(
            'An undifferentiated cell that can divide to make more cells and can differentiate into other types of cell',
            {
              allow: ['unspecialised for undifferentiated'],
            },
          ),
          point('Benefit: can replace damaged or faulty cells', {
            allow: ['a named condition, such as paralysis or type 1 diabetes, could be treated'],
          }),
          point('Objection: the embryo is destroyed or cannot give consent', {
            allow: ['ethical or religious objection to the use of embryos', 'risk of infection or rejection'],
            ignore: ['it is wrong', 'playing God'],
          }),
        ],
        model:
          'A stem cell is an undifferentiated cell that can divide to make more cells of the same type and can differentiate into other types of cell. Embryonic stem cells could replace damaged cells, such as nerve cells in paralysis. Some people object because the embryo is destroyed.',
      }),
    ],
  },
  {
    number: '3',
    title: 'Enzymes and digestion',
    weights: { 1: 16 },
    questions: [
      short({
        stem: r`Catalase breaks down hydrogen peroxide and releases oxygen. In 90 s, $36\ \text{cm}^3$ of oxygen is collected.

Calculate the mean rate of the reaction.`,
        seconds: 75,
        lines: 3,
        answerLabel: 'Mean rate =',
        answer: num(0.4, { unit: 'cm³/s' }),
        recompute: () => 36 / 90,
        model: '0.40',
        points: [r`$\text{Rate} = \dfrac{36}{90}$`, r`0.40 ($\text{cm}^3\text{/s}$)`],
        guidance:
          'A rate is an amount divided by a time. The unit printed on the answer line shows which way to divide.',
      }),
      shortParts({
        stem: 'Digestive enzymes break down large molecules into smaller ones that can be absorbed.',
        seconds: 110,
        parts: [
          part({
            prompt: 'Name the enzyme in saliva that breaks down starch.',
            answer: exactly(['amylase', 'salivary amylase', 'carbohydrase'], ['amylose', 'carbohydrate']),
            model: 'Amylase',
            points: [point('Amylase', { allow: ['carbohydrase'], reject: ['protease', 'lipase'] })],
          }),
          part({
            prompt: 'Name the molecules produced when proteins are completely digested.',
            answer: words('amino acids', 'amino acid', 'aminoacids', 'amino-acids'),
            model: 'Amino acids',
            points: ['Amino acids'],
          }),
          part({
            prompt: 'Name **two** substances produced when lipids are digested.',
            lines: 2,
            answer: wording(
              'fatty acids and glycerol',
              'glycerol and fatty acids',
              'fatty acid and glycerol',
              'glycerol and fatty acid',
              'fatty acids, glycerol',
              'glycerol, fatty acids',
              'fatty acids & glycerol',
              'glycerol & fatty acids',
              'fatty acids + glycerol',
              'glycerol + fatty acids',
              'three fatty acids and glycerol',
              'glycerol and three fatty acids',
              '3 fatty acids and glycerol',
            ),
            model: 'fatty acids and glycerol',
            points: ['Fatty acids', 'Glycerol'],
          }),
        ],
      }),
      shortParts({
        stem: 'A student tests a sample of food for protein.',
        seconds: 70,
        parts: [
          part({
            prompt: 'Name the reagent that the student should use.',
            answer: wording(
              'biuret',
              'biuret reagent',
              'biuret solution',
              'biuret’s reagent',
              "biuret's reagent",
              'biurets reagent',
              'Biuret A and Biuret B',
              'sodium hydroxide and copper sulfate',
              'copper sulfate and sodium hydroxide',
              'sodium hydroxide solution and copper sulfate solution',
              'copper sulfate solution and sodium hydroxide solution',
            ),
            model: 'Biuret reagent',
            points: [
              point('Biuret (reagent)', {
                allow: ['sodium hydroxide and copper sulfate'],
                reject: ['Benedict’s', 'iodine'],
              }),
            ],
          }),
          part({
            prompt: 'Give the colour seen if the food contains protein.',
            answer: words(
              'purple',
              'lilac',
              'violet',
              'mauve',
              'blue to purple',
              'blue-purple',
              'pinky-purple',
              'purple or lilac',
              'lilac or purple',
            ),
            model: 'Purple',
            points: [point('Purple', { allow: ['lilac', 'violet', 'mauve'], reject: ['blue', 'red'] })],
          }),
        ],
      }),
      short({
        stem: 'Name the organ that produces bile.',
        seconds: 30,
        answer: words('liver'),
        model: 'Liver',
        points: [point('Liver', { reject: ['gall bladder, which only stores bile', 'pancreas'] })],
      }),
      short({
        stem: r`At 20 °C an enzyme took 240 s to digest a sample of starch completely. At 35 °C it took 80 s to digest the same mass of starch.

$$\text{relative rate} = \dfrac{1000}{\text{time in seconds}}$$

Calculate the relative rate at 35 °C. Give it in $\text{s}^{-1}$.`,
        seconds: 80,
        lines: 3,
        answerLabel: 'Relative rate =',
        answer: num(12.5, { unit: 's⁻¹' }),
        recompute: () => 1000 / 80,
        model: '12.5',
        points: [r`Uses the time at 35 °C: $\dfrac{1000}{80}$`, r`12.5 ($\text{s}^{-1}$)`],
      }),
      recall({
        stem: 'Explain why an enzyme no longer works after it has been heated to a high temperature.',
        seconds: 110,
        lines: 6,
        points: [
          point('The enzyme is denatured', { reject: ['the enzyme is killed', 'the enzyme dies'] }),
          point('The shape of the active site changes', { reject: ['the shape of the substrate changes'] }),
          point('So the substrate no longer fits the active site', { allow: ['no enzyme–substrate complex can form'] }),
        ],
        model:
          'The high temperature denatures the enzyme. The shape of its active site changes, so the substrate no longer fits and the reaction is not catalysed.',
        guidance: 'Enzymes are not alive, so they cannot be killed. Write about the shape of the active site.',
      }),
      recall({
        stem: 'Describe how bile helps the digestion of lipids in the small intestine.',
        seconds: 150,
        lines: 7,
        points: [
          point('Bile is alkaline, so it neutralises acid from the stomach', {
            allow: ['neutralises hydrochloric acid'],
          }),
          point('This gives a pH at which lipase works faster', {
            allow: ['optimum pH for enzymes in the small intestine'],
          }),
          point('Bile emulsifies fats into small droplets', {
            reject: ['bile breaks down fat molecules', 'bile is an enzyme', 'bile digests fat'],
          }),
          'Small droplets have a larger surface area for lipase to act on',
        ],
        model:
          'Bile is alkaline, so it neutralises acid from the stomach and gives a pH at which lipase works faster. It emulsifies fats into small droplets, which have a larger surface area for lipase to act on.',
        guidance: 'Bile contains no enzymes. It has two jobs: one to do with pH, one to do with surface area.',
      }),
      recall({
        stem: 'Explain **four** ways in which the small intestine is adapted to absorb digested food quickly.',
        seconds: 140,
        lines: 7,
        points: [
          point('Villi and microvilli give a large surface area', { allow: ['the small intestine is very long'] }),
          point('Wall of each villus is one cell thick, so the diffusion distance is short', {
            allow: ['thin walls, so a short diffusion path'],
            reject: ['thin cell walls'],
          }),
          point('Dense capillary network carries food away and keeps the concentration gradient steep', {
            allow: ['a good blood supply'],
          }),
          point('Cells have many mitochondria, which release energy for active transport', {
            reject: ['mitochondria make energy'],
          }),
        ],
        model:
          'Villi and microvilli give a large surface area. The wall of each villus is one cell thick, so the diffusion distance is short. A dense network of capillaries carries the food away and keeps the concentration gradient steep. The cells have many mitochondria, which release energy for active transport.',
        guidance: 'For each feature, say how it makes absorption faster.',
      }),
    ],
  },
];
