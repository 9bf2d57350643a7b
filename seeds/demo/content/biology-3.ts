import { num, part, point, r, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

/** Paper 2: coordination, inheritance, evolution and ecology. */
export const coordinationInheritanceAndEcology: TopicContent[] = [
  {
    number: '7',
    title: 'Nerves, hormones and homeostasis',
    weights: { 2: 26 },
    questions: [
      short({
        stem: 'A nerve impulse travels 0.90 m along a neurone in 0.015 s.\n\nCalculate the speed of the impulse.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Speed =',
        answer: num(60, { unit: 'm/s' }),
        recompute: () => 0.9 / 0.015,
        model: '60',
        points: [r`$\text{Speed} = \dfrac{0.90}{0.015}$`, '60 (m/s)'],
      }),
      short({
        stem: 'A student measures his reaction time four times. His results, in seconds, are:\n\n0.26, 0.28, 0.43, 0.27\n\nOne result is anomalous. Calculate the mean of the other three.',
        seconds: 90,
        lines: 3,
        answerLabel: 'Mean reaction time =',
        answer: num(0.27, { unit: 's' }),
        recompute: () => (0.26 + 0.28 + 0.27) / 3,
        model: '0.27',
        points: [point('Leaves out 0.43 and adds the others: 0.26 + 0.28 + 0.27', { allow: ['0.81'] }), '0.27 (s)'],
        guidance: 'Leave an anomalous result out of the mean, and divide by the number of results you kept.',
      }),
      shortParts({
        stem: 'After a meal rich in carbohydrate, the concentration of glucose in the blood rises and a hormone is released.',
        seconds: 75,
        parts: [
          part({
            prompt: 'Name the organ that detects the rise in blood glucose concentration.',
            answer: words('pancreas'),
            model: 'Pancreas',
            points: [point('Pancreas', { reject: ['liver', 'brain'] })],
          }),
          part({
            prompt: 'Name the hormone that is released.',
            answer: words('insulin'),
            model: 'Insulin',
            points: [point('Insulin', { reject: ['glucagon', 'glycogen'] })],
          }),
        ],
      }),
      short({
        stem: 'Name the gap between two neurones.',
        seconds: 30,
        answer: words('synapse', 'synapses', 'synaptic cleft', 'synaptic gap'),
        model: 'Synapse',
        points: [point('Synapse', { reject: ['neurotransmitter'] })],
      }),
      shortParts({
        stem: 'Several hormones control the menstrual cycle.',
        seconds: 100,
        parts: [
          part({
            prompt: 'Name the hormone that causes an egg to mature in an ovary.',
            answer: exactly(
              [
                'FSH',
                'follicle stimulating hormone',
                'follicle-stimulating hormone',
                'F.S.H.',
                'follicle stimulating hormone (FSH)',
                'follicle-stimulating hormone (FSH)',
              ],
              ['LH'],
            ),
            model: 'FSH',
            points: [point('FSH', { allow: ['follicle stimulating hormone'] })],
          }),
          part({
            prompt: 'Name the hormone that stimulates the release of the egg.',
            answer: exactly(
              [
                'LH',
                'luteinising hormone',
                'luteinizing hormone',
                'L.H.',
                'luteinising hormone (LH)',
                'luteinizing hormone (LH)',
              ],
              ['FSH'],
            ),
            model: 'LH',
            points: [point('LH', { allow: ['luteinising hormone'] })],
          }),
          part({
            prompt: 'Name the hormone that maintains the lining of the uterus in the days after the egg is released.',
            answer: words('progesterone'),
            model: 'Progesterone',
            points: [point('Progesterone', { reject: ['testosterone', 'LH', 'FSH'] })],
          }),
        ],
        guidance:
          'FSH matures the egg, LH releases it, and progesterone maintains the lining. Oestrogen repairs the lining earlier in the cycle.',
      }),
      short({
        stem: 'Name the gland that is often called the master gland because its hormones act on other glands.',
        seconds: 30,
        answer: words('pituitary', 'pituitary gland'),
        model: 'Pituitary gland',
        points: [point('Pituitary (gland)', { reject: ['thyroid', 'hypothalamus'] })],
      }),
      recall({
        stem: 'A person touches a hot pan and pulls the hand away at once.\n\nDescribe the path of the nerve impulses in this reflex action, from stimulus to response.',
        seconds: 190,
        lines: 8,
        points: [
          point('Receptors in the skin detect the stimulus', { allow: ['receptors detect heat or pain'] }),
          point('Impulses pass along a sensory neurone to the spinal cord', {
            allow: ['to the central nervous system'],
          }),
          point('Through a relay neurone (in the spinal cord)', {
            reject: ['through the conscious part of the brain'],
          }),
          point('And along a motor neurone to a muscle', { allow: ['the effector'] }),
          'The muscle contracts and moves the hand away',
        ],
        model:
          'Receptors in the skin detect the heat. Impulses pass along a sensory neurone to the spinal cord, across a synapse to a relay neurone, and then along a motor neurone to a muscle in the arm. The muscle contracts and pulls the hand away.',
        guidance:
          'The order is receptor, sensory neurone, relay neurone, motor neurone, effector. Neurones carry impulses, not messages.',
      }),
      recall({
        stem: 'Compare the causes of type 1 and type 2 diabetes, and how each is usually treated.',
        seconds: 150,
        lines: 7,
        points: [
          point('In type 1 the pancreas does not produce enough insulin', { allow: ['produces no insulin'] }),
          point('In type 2 body cells no longer respond to insulin', {
            allow: ['cells are resistant to insulin'],
            reject: ['no insulin is made'],
          }),
          'Type 1 is treated with insulin injections',
          point('Type 2 is treated with a controlled diet and exercise', {
            allow: ['losing weight', 'drugs that lower blood glucose'],
          }),
        ],
        model:
          'In type 1 diabetes the pancreas does not produce enough insulin, and it is treated with insulin injections. In type 2 diabetes the body cells no longer respond to insulin, and it is usually treated with a controlled diet and exercise.',
        guidance: 'Four things are asked for: a cause and a treatment for each type.',
      }),
      recall({
        stem: 'Explain how the hormones insulin and glucagon keep the concentration of glucose in the blood within narrow limits.',
        tier: 'higher',
        seconds: 200,
        lines: 9,
        points: [
          'When blood glucose is too high, the pancreas releases insulin',
          point('Insulin makes glucose move into cells, and liver and muscle cells turn it into glycogen', {
            allow: ['glucose is stored as glycogen'],
            reject: ['insulin turns into glycogen', 'insulin is an enzyme'],
          }),
          'When blood glucose is too low, the pancreas releases glucagon',
          point('Glucagon makes liver cells turn glycogen into glucose, which is released into the blood', {
            reject: ['glucagon turns into glucose'],
          }),
          point('This is negative feedback: a change is reversed, which brings the level back to normal', {
            allow: ['each response returns the level to normal, which stops the response'],
          }),
        ],
        model:
          'When blood glucose is too high, the pancreas releases insulin. Glucose moves into cells, and liver and muscle cells turn it into glycogen, so the level falls. When blood glucose is too low, the pancreas releases glucagon, which makes liver cells turn glycogen into glucose that is released into the blood. This is negative feedback, because each change is reversed and the level goes back to normal.',
        guidance:
          'Glucose, glucagon and glycogen are easily mixed up, and a spelling halfway between two of them earns nothing.',
      }),
    ],
  },
  {
    number: '8',
    title: 'The brain and the eye',
    weights: { 2: 12 },
    isSeparateOnly: true,
    questions: [
      shortParts({
        stem: 'Different parts of the brain have different functions.',
        seconds: 95,
        parts: [
          part({
            prompt: 'Name the part that coordinates muscular activity and balance.',
            answer: exactly(['cerebellum'], ['cerebrum', 'cerebral cortex', 'medulla']),
            model: 'Cerebellum',
            points: [point('Cerebellum', { reject: ['cerebrum'] })],
          }),
          part({
            prompt: 'Name the part that controls unconscious activities such as heart rate and breathing.',
            answer: words('medulla', 'medulla oblongata'),
            model: 'Medulla',
            points: [point('Medulla', { reject: ['cerebellum'] })],
          }),
          part({
            prompt: 'Name the outer, folded part that controls consciousness, intelligence, memory and language.',
            answer: exactly(
              ['cerebral cortex', 'cortex', 'cerebrum', 'cerebral hemispheres', 'cerebral hemisphere'],
              ['cerebellum', 'medulla'],
            ),
            model: 'Cerebral cortex',
            points: [point('Cerebral cortex', { allow: ['cerebrum', 'cerebral hemispheres'], reject: ['cerebellum'] })],
          }),
        ],
        guidance:
          'Cerebellum and cerebrum look alike. The cerebellum is the smaller part at the back, for balance and coordination.',
      }),
      short({
        stem: 'Name the layer at the back of the eye that contains receptor cells sensitive to light.',
        seconds: 30,
        answer: words('retina'),
        model: 'Retina',
        points: [point('Retina', { reject: ['pupil', 'iris', 'optic nerve'] })],
      }),
      shortParts({
        stem: 'A person can see near objects clearly, but light from distant objects is focused in front of the retina.',
        seconds: 70,
        parts: [
          part({
            prompt: 'Name this defect of vision.',
            answer: words(
              'myopia',
              'short sight',
              'short-sight',
              'short-sightedness',
              'short sightedness',
              'shortsightedness',
              'short sighted',
              'short-sighted',
              'shortsighted',
              'near-sightedness',
              'nearsightedness',
              'near sightedness',
              'near-sighted',
              'near-sight',
              'myopic',
              'short-sightedness (myopia)',
              'myopia (short-sightedness)',
            ),
            model: 'Myopia',
            points: [point('Myopia', { allow: ['short-sightedness'], reject: ['hyperopia', 'long-sightedness'] })],
          }),
          part({
            prompt: 'Name the type of spectacle lens that corrects it.',
            answer: words(
              'concave',
              'concave lens',
              'diverging',
              'diverging lens',
              'concave lenses',
              'diverging lenses',
              'biconcave',
              'biconcave lens',
              'concave (diverging)',
              'diverging (concave)',
            ),
            model: 'Concave',
            points: [point('Concave', { allow: ['diverging'], reject: ['convex'] })],
          }),
        ],
      }),
      short({
        stem: 'Name the transparent layer at the front of the eye that refracts light as it enters.',
        seconds: 30,
        answer: words('cornea'),
        model: 'Cornea',
        points: [point('Cornea', { reject: ['lens', 'sclera', 'iris'] })],
      }),
      recall({
        stem: 'A person looks up from a distant view to read a book held close to the eyes.\n\nExplain how the eye changes so that the near object is in focus on the retina.',
        seconds: 150,
        lines: 7,
        points: [
          point('The ciliary muscles contract', { reject: ['the ciliary muscles relax', 'the ligaments contract'] }),
          'The suspensory ligaments loosen',
          point('The lens becomes thicker', { allow: ['more curved', 'more rounded'] }),
          point('So it refracts the light rays more strongly', {
            allow: ['bends the light more'],
            reject: ['reflects'],
          }),
        ],
        model:
          'The ciliary muscles contract, so the suspensory ligaments loosen. The lens becomes thicker and more curved, and it refracts the light rays more strongly so that they meet on the retina.',
        guidance: 'Ligaments loosen and tighten; only muscles contract and relax.',
      }),
      recall({
        stem: 'A person walks from a dark room into bright sunlight.\n\nExplain how the iris responds and why this response is useful.',
        seconds: 120,
        lines: 6,
        points: [
          point('Circular muscles in the iris contract (and radial muscles relax)', { reject: ['ciliary muscles'] }),
          point('So the pupil becomes smaller', { allow: ['the pupil constricts'] }),
          point('Less light enters, which prevents damage to the retina', { ignore: ['protects the eye'] }),
        ],
        model:
          'The circular muscles in the iris contract and the radial muscles relax, so the pupil becomes smaller. Less light enters the eye, which prevents damage to the retina.',
      }),
    ],
  },
  {
    number: '9',
    title: 'Inheritance, variation and evolution',
    weights: { 2: 36 },
    questions: [
      shortParts({
        stem: 'In mice the allele for black fur, **B**, is dominant to the allele for brown fur, **b**. Two mice that are both **Bb** are bred together.',
        seconds: 120,
        parts: [
          part({
            prompt: 'Give the word that describes the genotype **Bb**.',
            answer: words('heterozygous', 'heterozygote'),
            model: 'Heterozygous',
            points: [point('Heterozygous', { reject: ['homozygous', 'dominant', 'carrier'] })],
          }),
          part({
            prompt: 'Give the probability that one of their offspring has brown fur, as a decimal.',
            lines: 4,
            answerLabel: 'Probability =',
            answer: num(0.25),
            recompute: () => 0.5 * 0.5,
            model: '0.25',
            points: [
              'Offspring genotypes BB, Bb, Bb and bb, from a Punnett square or other working',
              point('0.25', { allow: ['1/4', '25%'], reject: ['1 : 4', '3 : 1'] }),
            ],
          }),
        ],
        guidance: 'Only **bb** has brown fur, which is one box of the four in a Punnett square.',
      }),
      short({
        stem: 'Polydactyly (having extra fingers or toes) is caused by a dominant allele, **D**. One parent is **Dd** and the other is **dd**.\n\nCalculate the probability that their child has polydactyly. Give your answer as a percentage.',
        seconds: 100,
        lines: 4,
        answerLabel: 'Probability =',
        answer: num(50, { unit: '%' }),
        recompute: () => 0.5 * 1 * 100,
        model: '50',
        points: ['Offspring genotypes Dd and dd, in equal numbers', '50 (%)'],
        guidance: 'A dominant allele shows even when there is only one copy, so every **Dd** child has the condition.',
      }),
      short({
        stem: 'Give the combination of sex chromosomes in the body cells of a human male.',
        seconds: 30,
        answer: words(
          'XY',
          'X and Y',
          'X Y',
          'YX',
          'Y and X',
          'X, Y',
          'X + Y',
          'X/Y',
          'one X and one Y',
          'an X and a Y',
          'X and a Y',
        ),
        model: 'XY',
        points: [point('XY', { reject: ['XX', 'Y alone'] })],
      }),
      short({
        stem: 'When two heterozygous tall pea plants are crossed, tall and dwarf offspring are expected in the ratio 3 : 1. A cross gives 428 offspring.\n\nCalculate the number of dwarf plants expected.',
        seconds: 80,
        lines: 3,
        answerLabel: 'Number of dwarf plants =',
        answer: num(107),
        recompute: () => 428 / (3 + 1),
        model: '107',
        points: [point(r`$428 \div 4$`, { reject: ['428 ÷ 3'] }), '107'],
        guidance: r`A ratio of 3 : 1 has four parts, so the dwarf plants are $\frac{1}{4}$ of the total.`,
      }),
      short({
        stem: 'State what is meant by a **mutation**.',
        seconds: 45,
        lines: 2,
        answer: wording(
          'a change in DNA',
          'a change in the DNA',
          'change in DNA',
          'a change in a gene',
          'a change to a gene',
          'a random change in DNA',
          'a random change in a gene',
          'a change in the base sequence of DNA',
          'a change in the sequence of bases in DNA',
          'a change in the genetic material',
          'a change to the genetic material',
          'a change in a chromosome',
          'a change in genetic code',
        ),
        model: 'a change in the sequence of bases in DNA',
        points: [
          point('A change in DNA', {
            allow: ['a change in a gene or in the genetic code'],
            reject: ['a change in appearance alone'],
          }),
        ],
      }),
      short({
        stem: 'The wolf has the scientific name *Canis lupus*.\n\nName the level of classification given by the first word, *Canis*.',
        seconds: 35,
        answer: exactly(['genus', 'genus name'], ['genes']),
        model: 'Genus',
        points: [point('Genus', { reject: ['species', 'family', 'kingdom'] })],
      }),
      short({
        stem: 'In a survey of fossils, one rock layer is found to be 66 million years old. It is 45 m below a layer that is 51 million years old.\n\nCalculate the mean rate at which the rock built up between them, in metres per million years.',
        seconds: 90,
        lines: 3,
        answerLabel: 'Mean rate =',
        answer: num(3, { unit: 'm per million years' }),
        recompute: () => 45 / (66 - 51),
        model: '3',
        points: [r`Time $= 66 - 51 = 15$ (million years)`, r`$\dfrac{45}{15} = 3$ (m per million years)`],
      }),
      recall({
        stem: 'A population of rabbits spreads into a colder region. After many generations most of the rabbits have thicker fur.\n\nExplain how natural selection could bring about this change.',
        seconds: 200,
        lines: 9,
        points: [
          point('There is variation in the thickness of fur in the population', {
            allow: ['a mutation gives some rabbits thicker fur'],
            reject: ['the rabbits grow thicker fur because they need it'],
          }),
          point('Rabbits with thicker fur are more likely to survive in the cold', {
            ignore: ['survival of the fittest'],
          }),
          'So they are more likely to breed',
          point('They pass on the alleles for thicker fur to their offspring', { allow: ['genes for alleles'] }),
          'Over many generations the proportion of rabbits with thicker fur increases',
        ],
        model:
          'There is variation in the rabbits’ fur, caused by mutation, so some have thicker fur. These rabbits are more likely to survive in the cold and to breed. They pass on the alleles for thicker fur to their offspring. Over many generations a larger and larger proportion of the population has thick fur.',
        guidance: 'Variation comes first, and comes by chance. Rabbits do not change because they need to.',
      }),
      recall({
        stem: 'Explain how a strain of bacteria that is resistant to an antibiotic can become common.',
        seconds: 150,
        lines: 7,
        points: [
          point('A random mutation makes some bacteria resistant', {
            reject: ['the antibiotic causes the mutation', 'bacteria become immune'],
          }),
          'The antibiotic kills the bacteria that are not resistant',
          point('The resistant bacteria survive and reproduce', {
            allow: ['less competition for the resistant bacteria'],
          }),
          'They pass on the gene for resistance, so the resistant strain increases in number',
        ],
        model:
          'A random mutation makes some bacteria resistant. When the antibiotic is used, it kills the bacteria that are not resistant. The resistant bacteria survive and reproduce, passing on the gene for resistance, so the resistant strain becomes common.',
        guidance:
          'The mutation comes first and by chance. The antibiotic then selects the resistant bacteria; it does not cause the mutation.',
      }),
      recall({
        stem: 'Compare cell division by mitosis with cell division by meiosis in humans.',
        seconds: 150,
        lines: 7,
        points: [
          point('Mitosis makes two cells and meiosis makes four', {
            allow: ['one division in mitosis and two in meiosis'],
          }),
          'Cells made by mitosis are genetically identical and cells made by meiosis are genetically different',
          point(
            'Cells made by mitosis have the full number of chromosomes (46) and cells made by meiosis have half (23)',
            { allow: ['diploid and haploid'] },
          ),
          point('Mitosis is for growth and repair and meiosis is for making gametes', { allow: ['eggs and sperm'] }),
        ],
        model:
          'Mitosis makes two cells that are genetically identical and have the full number of chromosomes, 46. Meiosis makes four cells that are genetically different and have half the number of chromosomes, 23. Mitosis is for growth and repair, and meiosis is for making gametes.',
        guidance: 'Each mark needs both halves of the comparison.',
      }),
      recall({
        stem: 'A farmer wants cows that produce more milk.\n\nDescribe how selective breeding could be used, and give one risk of selective breeding.',
        seconds: 150,
        lines: 7,
        points: [
          point(
            'Choose the cows with the highest milk yield, and bulls whose female relatives have a high yield, and breed them together',
            { allow: ['choose parents with the desired feature and breed them'] },
          ),
          'From the offspring, choose those with the highest yield to breed again',
          'Repeat over many generations',
          point(
            'Risk: less variation, or inbreeding, so the herd is more likely to have inherited defects or to be harmed by one disease',
            {
              allow: ['smaller gene pool'],
              ignore: ['it takes a long time', 'it is cruel'],
            },
          ),
        ],
        model:
          'Choose the cows that produce the most milk and breed them with bulls from high-yielding families. From their offspring, choose the best milk producers and breed those. Repeat this over many generations. One risk is inbreeding, which reduces variation, so the herd may be more prone to disease or inherited defects.',
      }),
      recall({
        stem: 'Bacteria can be genetically engineered to produce human insulin.\n\nDescribe the main steps in this process.',
        tier: 'higher',
        seconds: 150,
        lines: 7,
        points: [
          point('Enzymes are used to cut out the human gene for insulin', {
            allow: ['restriction enzymes'],
            reject: ['cut out the insulin'],
          }),
          point('The gene is put into a vector, such as a plasmid', { allow: ['virus for plasmid'] }),
          'The vector is used to put the gene into bacterial cells',
          point('The bacteria multiply (in a fermenter) and make insulin', {
            allow: ['the bacteria are cloned and the insulin is collected'],
          }),
        ],
        model:
          'Enzymes are used to cut the human gene for insulin out of a chromosome. The gene is inserted into a vector, usually a bacterial plasmid. The vector is put into bacterial cells. The bacteria multiply in a fermenter and make human insulin, which is collected.',
      }),
    ],
  },
  {
    number: '10',
    title: 'Ecology',
    weights: { 2: 26 },
    questions: [
      short({
        stem: r`A student places 10 quadrats at random in a field. Each quadrat has an area of $0.25\ \text{m}^2$. She counts 35 dandelions in total. The area of the field is $600\ \text{m}^2$.

Estimate the number of dandelions in the field.`,
        seconds: 130,
        lines: 5,
        answerLabel: 'Number of dandelions =',
        answer: num(8400),
        recompute: () => (35 / (10 * 0.25)) * 600,
        model: '8400',
        points: [
          point(r`Mean per quadrat $= \dfrac{35}{10} = 3.5$`, { allow: ['total area sampled = 2.5 m²'] }),
          r`Number per square metre $= \dfrac{3.5}{0.25} = 14$`,
          '8400',
        ],
        guidance: r`Find the number in $1\ \text{m}^2$ first, then multiply by the area of the field.`,
      }),
      shortParts({
        stem: r`Here is a food chain:

$\text{grass} \rightarrow \text{grasshopper} \rightarrow \text{frog} \rightarrow \text{heron}$`,
        seconds: 70,
        parts: [
          part({
            prompt: 'Name the producer.',
            answer: words('grass'),
            model: 'Grass',
            points: ['Grass'],
          }),
          part({
            prompt: 'Name the secondary consumer.',
            answer: words('frog', 'frogs'),
            model: 'Frog',
            points: [point('Frog', { reject: ['grasshopper', 'heron'] })],
          }),
        ],
        guidance: 'The primary consumer eats the producer, and the secondary consumer eats the primary consumer.',
      }),
      short({
        stem: 'The number of hedgehogs counted in an area fell from 480 to 300 in ten years.\n\nCalculate the percentage decrease.',
        seconds: 75,
        lines: 3,
        answerLabel: 'Percentage decrease =',
        answer: num(37.5, { unit: '%' }),
        recompute: () => ((480 - 300) / 480) * 100,
        model: '37.5',
        points: [r`$\dfrac{480 - 300}{480} \times 100$`, '37.5 (%)'],
        guidance: 'Divide the decrease by the original number, 480.',
      }),
      short({
        stem: 'Give the scientific term for the interaction of a community of living organisms with the non-living parts of their environment.',
        seconds: 35,
        answer: words('ecosystem', 'an ecosystem', 'ecosystems', 'eco-system'),
        model: 'Ecosystem',
        points: [point('Ecosystem', { reject: ['habitat', 'biodiversity', 'environment'] })],
      }),
      short({
        stem: 'Here are five factors that affect a community:\n\nlight intensity, new predators, soil pH, temperature, wind direction\n\nName the one that is a **biotic** factor.',
        seconds: 40,
        answer: words('new predators', 'predators', 'new predator', 'predator', 'predation'),
        model: 'New predators',
        points: [point('New predators', { reject: ['more than one factor'] })],
      }),
      short({
        stem: 'Name the process by which water vapour in the air becomes liquid water in clouds.',
        seconds: 30,
        answer: words('condensation', 'condensing', 'condense', 'condenses'),
        model: 'Condensation',
        points: [point('Condensation', { reject: ['precipitation', 'evaporation'] })],
      }),
      recall({
        stem: 'Explain how carbon in a dead leaf can become part of a living plant again.',
        seconds: 150,
        lines: 7,
        points: [
          point('Microorganisms (decomposers) break down the leaf', {
            allow: ['bacteria or fungi decay the leaf'],
            reject: ['germs'],
          }),
          'The microorganisms respire',
          point('Respiration releases carbon dioxide into the air', { reject: ['releases carbon', 'releases oxygen'] }),
          point('Plants take in the carbon dioxide for photosynthesis (and make glucose)', {
            reject: ['plants take in carbon through their roots'],
          }),
        ],
        model:
          'Microorganisms break down the dead leaf. They respire, and this releases carbon dioxide into the air. Living plants take in the carbon dioxide and use it in photosynthesis to make glucose and other carbon compounds.',
        guidance: 'Write "carbon dioxide", not "carbon", for the gas, and name respiration and photosynthesis.',
      }),
      recall({
        stem: 'Describe how a student could use a transect to investigate how the number of daisies changes with distance from a large tree.',
        seconds: 190,
        lines: 8,
        points: [
          point('Lay a tape measure in a straight line from the tree', { allow: ['string marked at intervals'] }),
          point('Place a quadrat at regular intervals along the line', {
            allow: ['every metre'],
            reject: ['place quadrats at random'],
          }),
          point('Count the daisies in each quadrat', { allow: ['estimate the percentage cover'] }),
          point('Repeat with further transects and calculate a mean for each distance', {
            ignore: ['repeat to be accurate'],
          }),
        ],
        model:
          'Lay a tape measure in a straight line out from the tree. Place a quadrat at regular intervals, such as every metre, along the tape and count the daisies in each one. Repeat with two more transects in other directions and calculate the mean number of daisies at each distance.',
        guidance:
          'A transect is for a change across an area, so the quadrats are placed at regular intervals. Random placing is for estimating a whole population.',
      }),
      recall({
        stem: 'The number of snowshoe hares in an area rises. Lynx are their main predators.\n\nExplain how the numbers of lynx and hares are likely to change after this.',
        seconds: 120,
        lines: 6,
        points: [
          point('The number of lynx rises because they have more food', { allow: ['more lynx survive and breed'] }),
          'The number of hares then falls because more of them are eaten',
          point('The number of lynx then falls because they have less food', {
            allow: ['lynx starve or breed less'],
            ignore: ['the cycle repeats'],
          }),
        ],
        model:
          'The number of lynx rises because there is more food for them, so more survive and breed. More hares are then eaten, so the number of hares falls. There is then less food for the lynx, so the number of lynx falls too.',
        guidance: 'Each change needs its reason: more food, more eaten, less food.',
      }),
      recall({
        stem: 'Large areas of tropical forest are cut down and burned to make room for cattle.\n\nExplain how this reduces biodiversity and how it raises the concentration of carbon dioxide in the air.',
        seconds: 160,
        lines: 7,
        points: [
          point('Habitats are destroyed', { allow: ['food sources or shelter are lost'] }),
          point('So some species die out or move away, and there are fewer different species', {
            allow: ['fewer species of plants and animals'],
            reject: ['fewer animals, with no mention of species'],
          }),
          point('Burning the trees releases carbon dioxide', {
            allow: ['decay of the wood by microorganisms, which respire'],
          }),
          point('Fewer trees take in carbon dioxide for photosynthesis', {
            reject: ['trees take in carbon dioxide for respiration'],
          }),
        ],
        model:
          'Cutting down the forest destroys habitats, so some species die out and there are fewer different species. Burning the trees releases carbon dioxide, and there are fewer trees to take carbon dioxide in for photosynthesis.',
        guidance: 'Two effects are asked for. Biodiversity is about the number of different species, so use that word.',
      }),
    ],
  },
];
