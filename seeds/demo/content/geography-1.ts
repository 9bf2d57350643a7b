import { num, part, point, r, recall, short, shortParts, type TopicContent, words } from './build.ts';

/** Paper 1: hazards, climate, ecosystems and rivers. */
export const geographyTopics1To4: TopicContent[] = [
  {
    number: '1',
    title: 'Tectonic hazards',
    weights: { 1: 17 },
    questions: [
      shortParts({
        seconds: 100,
        stem: 'At one type of plate margin an oceanic plate moves towards a continental plate.',
        guidance:
          'Dense oceanic crust sinks beneath lighter continental crust. Constructive margins are where plates move apart.',
        parts: [
          part({
            prompt: 'Name this type of plate margin.',
            answer: words(
              'destructive',
              'destructive margin',
              'destructive plate margin',
              'destructive boundary',
              'destructive plate boundary',
              'convergent',
              'convergent margin',
              'convergent boundary',
              'convergent plate margin',
              'convergent plate boundary',
              'subduction zone',
              'subduction',
              'subduction margin',
              'subduction boundary',
            ),
            model: 'destructive',
            points: [point('destructive', { allow: ['convergent'], reject: ['collision', 'constructive'] })],
          }),
          part({
            prompt: 'Name the process by which the oceanic plate sinks into the mantle.',
            answer: words('subduction', 'it is subducted', 'subducted', 'subducting', 'subducts'),
            model: 'subduction',
            points: ['subduction'],
          }),
          part({
            prompt: 'Name the long, deep landform on the sea bed where the plate begins to sink.',
            answer: words(
              'ocean trench',
              'oceanic trench',
              'trench',
              'trenches',
              'deep-sea trench',
              'deep sea trench',
              'deep ocean trench',
              'sea trench',
              'submarine trench',
              'subduction trench',
            ),
            model: 'ocean trench',
            points: [point('ocean trench', { allow: ['trench'] })],
          }),
        ],
      }),
      recall({
        seconds: 160,
        stem: 'Explain why earthquakes happen at conservative plate margins.',
        lines: 8,
        points: [
          point('Two plates slide past each other', {
            allow: ['in opposite directions, or in the same direction at different speeds'],
            reject: ['plates move towards each other'],
          }),
          point('Friction makes the plates lock together', { allow: ['the plates stick'] }),
          point('Stress builds up along the margin', { allow: ['pressure builds up', 'strain energy builds up'] }),
          point('The plates suddenly slip and energy is released as seismic waves', { allow: ['shock waves'] }),
        ],
        model:
          'At a conservative margin two plates slide past each other. Friction locks them together, so stress builds up. When the stress is greater than the friction, the plates slip suddenly and the energy is released as seismic waves.',
        guidance:
          'Give the full chain: movement, sticking, build-up, release. No magma is involved at this type of margin.',
      }),
      short({
        seconds: 40,
        stem: 'Name the point on the Earth’s surface directly above the focus of an earthquake.',
        answer: words('epicentre', 'epicenter', 'earthquake epicentre'),
        model: 'epicentre',
        points: [point('epicentre', { reject: ['hypocentre', 'focus'] })],
      }),
      short({
        seconds: 70,
        stem: 'On one magnitude scale each increase of 1 means that the ground shakes with ten times the amplitude. Calculate how many times greater the amplitude is for an earthquake of magnitude 7.0 than for one of magnitude 5.0 at the same distance.',
        lines: 2,
        answerLabel: 'Number of times greater =',
        answer: num(100),
        recompute: () => 10 ** (7 - 5),
        model: '100',
        points: ['10 × 10', point('100', { reject: ['20'] })],
        guidance: 'The scale is logarithmic, so the steps multiply. Two steps are 10 × 10, not 10 + 10.',
      }),
      short({
        seconds: 80,
        guidance:
          'Divide deaths by population, then multiply by 100,000. A rate lets you compare places with different populations.',
        stem: 'An earthquake strikes the region of Varesta, which has a population of 310,000. It causes 1,240 deaths. Calculate the number of deaths per 100,000 people.',
        lines: 2,
        answerLabel: 'Deaths per 100,000 people =',
        answer: num(400),
        recompute: () => (1240 / 310000) * 100000,
        model: '400',
        points: [r`$\dfrac{1240}{310\,000} \times 100\,000$`, '400'],
      }),
      recall({
        seconds: 130,
        stem: 'Give two primary effects and two secondary effects of a major earthquake.',
        lines: 6,
        points: [
          point('One primary effect, for example buildings collapse', {
            allow: ['people are killed or injured by falling debris', 'roads, bridges or pipes are damaged'],
          }),
          point('A second, different primary effect', {
            allow: ['people are killed or injured by falling debris', 'roads, bridges or pipes are damaged'],
          }),
          point('One secondary effect, for example fires from broken gas pipes', {
            allow: ['tsunami', 'landslides', 'homelessness', 'disease from dirty water', 'loss of trade or tourism'],
          }),
          point('A second, different secondary effect', {
            allow: ['tsunami', 'landslides', 'homelessness', 'disease from dirty water', 'loss of trade or tourism'],
          }),
        ],
        model:
          'Primary effects: buildings collapse, and people are killed or injured by falling debris. Secondary effects: fires start where gas pipes have broken, and landslides block roads so that help arrives late.',
        guidance:
          'Primary effects are caused directly by the shaking. Secondary effects follow from the primary ones, minutes to years later.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain two ways in which protection and planning can reduce the effects of earthquakes.',
        lines: 8,
        points: [
          point('A way of protecting buildings, for example shock absorbers or cross-bracing', {
            allow: ['base isolation', 'automatic window shutters', 'strengthened bridges'],
          }),
          point('The building absorbs movement and is less likely to collapse, so fewer people are killed'),
          point('A way of planning, for example earthquake drills in schools and offices', {
            allow: [
              'emergency kits',
              'emergency services practise their response',
              'hazard maps that control building',
            ],
          }),
          point('People know what to do, or help arrives quickly, so fewer people are injured', {
            reject: ['the earthquake is prevented'],
          }),
        ],
        model:
          'Buildings can be given shock absorbers in their foundations. These absorb the movement, so the building is less likely to collapse and kill people. Drills can be held in schools and offices, so people know to shelter under a table and fewer are injured by falling objects.',
        guidance:
          'One mark is for each method and one for how it reduces the effects. Nothing can stop an earthquake happening.',
      }),
    ],
  },
  {
    number: '2',
    title: 'Weather hazards and climate change',
    weights: { 1: 17 },
    questions: [
      short({
        seconds: 40,
        guidance:
          'The warm layer must also be deep, about 60 m or more. This is why tropical storms form in the tropics in late summer and autumn.',
        stem: 'State the approximate minimum temperature of the sea surface needed for a tropical storm to form.',
        answerLabel: 'Temperature =',
        answer: num(26.5, { range: { min: 26, max: 27 }, unit: '°C' }),
        model: '27',
        points: [point('27 °C', { allow: ['any value from 26 °C to 27 °C'] })],
      }),
      recall({
        seconds: 160,
        stem: 'Explain how a tropical storm forms.',
        lines: 8,
        points: [
          point('Warm ocean water heats the air above it, so warm, moist air rises quickly', {
            allow: ['evaporation from an ocean at 26 to 27 °C or more'],
          }),
          point('This leaves an area of low pressure at the surface, which draws in more air'),
          point('The rising air cools and water vapour condenses, releasing heat that powers the storm', {
            allow: ['latent heat', 'towering clouds form'],
          }),
          point('The Earth’s rotation makes the storm spin', { allow: ['the Coriolis effect'] }),
        ],
        model:
          'A warm ocean heats the air above it, and warm, moist air rises quickly. This leaves low pressure at the surface, so more air is drawn in. The rising air cools and condenses into cloud, releasing heat that powers the storm. The Coriolis effect makes the system spin.',
        guidance: 'Write it as a sequence from sea surface to spinning storm. Effects of the storm earn nothing here.',
      }),
      shortParts({
        seconds: 60,
        stem: 'These are two parts of a tropical storm.',
        parts: [
          part({
            prompt: 'Name the calm, often cloudless area at the centre.',
            answer: words('eye', 'eye of the storm', 'storm eye'),
            model: 'eye',
            points: ['eye'],
          }),
          part({
            prompt: 'Name the ring of tall cloud around the centre where winds are strongest.',
            answer: words('eyewall', 'eye wall', 'eye-wall', 'wall of the eye'),
            model: 'eyewall',
            points: ['eyewall'],
          }),
        ],
      }),
      short({
        seconds: 70,
        stem: `Rainfall at Harnmouth in six months was:

- January 82 mm
- February 64 mm
- March 71 mm
- April 55 mm
- May 48 mm
- June 40 mm

Calculate the mean monthly rainfall for these six months.`,
        lines: 2,
        answerLabel: 'Mean =',
        answer: num(60, { unit: 'mm' }),
        recompute: () => (82 + 64 + 71 + 55 + 48 + 40) / 6,
        model: '60',
        points: [r`$\dfrac{360}{6}$, or total of $360$ seen`, '60 (mm)'],
      }),
      short({
        seconds: 45,
        stem: 'Scientists drill long cylinders from ice sheets and study the gases trapped in them to find out about past climates. Name this source of evidence.',
        answer: words('ice cores', 'ice core', 'ice core samples', 'ice core data', 'ice coring', 'ice sheet cores'),
        model: 'ice cores',
        points: ['ice cores'],
      }),
      short({
        seconds: 85,
        stem: 'A tide gauge at Harnmouth gave a mean sea level of 7.012 m in 1990 and 7.124 m in 2022. Calculate the mean rate of sea level rise in millimetres per year.',
        lines: 3,
        answerLabel: 'Mean rate =',
        answer: num(3.5, { unit: 'mm per year' }),
        recompute: () => ((7.124 - 7.012) * 1000) / (2022 - 1990),
        model: '3.5',
        points: ['Rise of 112 mm in 32 years', '3.5 (mm per year)'],
        guidance: 'Change metres to millimetres, then divide by the number of years.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain two natural causes of climate change.',
        lines: 8,
        points: [
          point('One natural cause named, for example changes in the Earth’s orbit', {
            allow: ['volcanic eruptions', 'changes in solar output', 'sunspots'],
            reject: ['burning fossil fuels', 'deforestation'],
          }),
          point(
            'How it changes the climate, for example a different orbit or tilt changes how much solar energy the Earth receives',
            {
              allow: ['more sunspots mean more energy from the Sun'],
            },
          ),
          point('A second natural cause named, for example large volcanic eruptions', {
            allow: ['orbital changes', 'changes in solar output'],
          }),
          point('How it changes the climate, for example ash and sulfur dioxide reflect sunlight and cool the Earth'),
        ],
        model:
          'The shape of the Earth’s orbit and its tilt change over thousands of years, which changes the amount of solar energy reaching different parts of the Earth. Large volcanic eruptions put ash and sulfur dioxide high in the atmosphere, where they reflect sunlight and cool the Earth for a year or more.',
        guidance: 'Each cause carries one mark for naming it and one for the link to temperature.',
      }),
      recall({
        seconds: 140,
        guidance:
          'Mitigation deals with the cause and adaptation with the effect. Two of the four marks are for examples that fit.',
        stem: 'Explain the difference between mitigation and adaptation as responses to climate change. Give an example of each.',
        lines: 7,
        points: [
          point('Mitigation reduces the causes of climate change', { allow: ['reduces greenhouse gas emissions'] }),
          point('An example of mitigation, for example using renewable energy', {
            allow: ['planting trees', 'carbon capture', 'international agreements'],
          }),
          point('Adaptation responds to the effects of climate change', { allow: ['copes with', 'adjusts to'] }),
          point('An example of adaptation, for example building sea walls', {
            allow: ['drought-resistant crops', 'managing water supply', 'raising houses on stilts'],
          }),
        ],
        model:
          'Mitigation reduces the causes of climate change, for example by using wind power in place of coal. Adaptation means adjusting to its effects, for example by building flood walls against a rising sea.',
      }),
    ],
  },
  {
    number: '3',
    title: 'Ecosystems and tropical rainforests',
    weights: { 1: 16 },
    questions: [
      shortParts({
        seconds: 90,
        stem: 'A food chain in a pond-side meadow is: grass → grasshopper → frog → snake.',
        guidance:
          'Arrows in a food chain point the way energy moves. Producers make their own food; the animal that eats them is the primary consumer.',
        parts: [
          part({
            prompt: 'Name the producer.',
            answer: words('grass', 'grasses'),
            model: 'grass',
            points: ['grass'],
          }),
          part({
            prompt: 'Name the primary consumer.',
            answer: words('grasshopper', 'grasshoppers'),
            model: 'grasshopper',
            points: ['grasshopper'],
          }),
          part({
            prompt: 'A disease kills most of the frogs. Name the animal whose numbers would be expected to rise first.',
            answer: words('grasshopper', 'grasshoppers'),
            model: 'grasshopper',
            points: [point('grasshopper', { reject: ['snake'] })],
          }),
        ],
      }),
      short({
        seconds: 40,
        stem: 'State the term for the number and variety of living species found in an area.',
        answer: words('biodiversity', 'biological diversity', 'species diversity'),
        model: 'biodiversity',
        points: [point('biodiversity', { reject: ['ecosystem', 'biome'] })],
      }),
      short({
        seconds: 40,
        stem: 'Name the layer of a tropical rainforest in which the crowns of the trees form an almost continuous roof.',
        answer: words('canopy', 'canopies', 'main canopy', 'canopy layer', 'main canopy layer'),
        model: 'canopy',
        points: [point('canopy', { reject: ['emergent layer', 'under canopy'] })],
      }),
      shortParts({
        seconds: 110,
        stem: 'The rainforest of Tarumba covered 48,000 km² in 2000 and 40,800 km² in 2020.',
        parts: [
          part({
            prompt: 'Calculate the percentage decrease in area.',
            lines: 2,
            answer: num(15, { unit: '%' }),
            answerLabel: 'Percentage decrease =',
            recompute: () => ((48000 - 40800) / 48000) * 100,
            model: '15',
            points: [r`$\dfrac{7200}{48\,000} \times 100$`, '15 (%)'],
          }),
          part({
            prompt: 'Calculate the mean area lost per year.',
            lines: 1,
            answer: num(360, { unit: 'km² per year' }),
            answerLabel: 'Mean area lost =',
            recompute: () => (48000 - 40800) / (2020 - 2000),
            model: '360',
            points: ['360 (km² per year)'],
          }),
        ],
        guidance: 'Percentage change always divides by the starting value, here 48,000.',
      }),
      short({
        seconds: 45,
        stem: 'At a rainforest weather station the mean temperature of the warmest month is 27.8 °C and of the coolest month is 25.9 °C. Calculate the annual temperature range.',
        answerLabel: 'Range =',
        answer: num(1.9, { unit: '°C' }),
        recompute: () => 27.8 - 25.9,
        model: '1.9',
        points: ['1.9 (°C)'],
      }),
      recall({
        seconds: 160,
        stem: 'Explain why most tropical rainforest soils are infertile even though plant growth is rapid.',
        lines: 8,
        points: [
          point('Most nutrients are stored in the living plants rather than in the soil', {
            allow: ['in the biomass'],
          }),
          point('Dead leaves decompose quickly in the hot, wet conditions', {
            allow: ['rapid decomposition by decomposers'],
          }),
          point('Shallow roots take up the released nutrients quickly'),
          point('Heavy rain washes nutrients out of the soil', { allow: ['leaching'] }),
        ],
        model:
          'Most of the nutrients are held in the plants, not the soil. Leaves that fall decompose quickly in the hot, wet conditions, and roots near the surface take up the nutrients at once. Heavy rain leaches what remains out of the soil.',
        guidance: 'Follow the nutrients from leaf to soil to root, then add leaching.',
      }),
      recall({
        seconds: 140,
        stem: 'Explain two ways in which plants are adapted to living in a tropical rainforest.',
        lines: 7,
        points: [
          point('One adaptation described, for example buttress roots', {
            allow: ['drip tips', 'lianas that climb trees', 'tall straight trunks', 'smooth thin bark', 'epiphytes'],
            reject: ['adaptations of animals'],
          }),
          point('How it helps, for example buttress roots support tall trees in shallow soil'),
          point('A second adaptation described, for example leaves with drip tips'),
          point(
            'How it helps, for example drip tips let heavy rain run off so that the leaf does not break or grow mould',
          ),
        ],
        model:
          'Tall trees have buttress roots, which are wide and give support in shallow soil. Many leaves have drip tips, so heavy rain runs off quickly and the leaf is not damaged.',
      }),
      recall({
        seconds: 150,
        stem: 'Explain how selective logging and ecotourism can each help to manage a tropical rainforest sustainably.',
        lines: 8,
        points: [
          point('In selective logging only chosen trees are cut and the others are left', {
            allow: ['only mature trees are felled'],
          }),
          point('So the forest can regrow and habitats are kept', { allow: ['soil is still protected from erosion'] }),
          point('Ecotourism brings small groups of visitors who pay to see the forest with little damage to it'),
          point('So local people earn money from keeping the forest rather than clearing it', {
            allow: ['income pays for conservation'],
          }),
        ],
        model:
          'In selective logging only chosen mature trees are felled, so most of the forest is left to regrow and habitats are kept. Ecotourism brings small numbers of paying visitors and does little damage, so local people earn an income from the forest without clearing it.',
      }),
    ],
  },
  {
    number: '4',
    title: 'River landscapes',
    weights: { 1: 16 },
    questions: [
      shortParts({
        seconds: 85,
        stem: 'Name the process of river erosion described in each case.',
        parts: [
          part({
            prompt: 'Rocks carried by the river knock against each other and become smaller and rounder.',
            answer: words('attrition'),
            model: 'attrition',
            points: [point('attrition', { reject: ['abrasion'] })],
          }),
          part({
            prompt: 'The force of the water, and air pressed into cracks, breaks up the banks.',
            answer: words(
              'hydraulic action',
              'hydraulic power',
              'hydraulic pressure',
              'hydraulic erosion',
              'hydraulics',
            ),
            model: 'hydraulic action',
            points: ['hydraulic action'],
          }),
          part({
            prompt: 'Material carried by the river scrapes and wears away the bed and banks.',
            answer: words('abrasion', 'corrasion'),
            model: 'abrasion',
            points: [point('abrasion', { allow: ['corrasion'], reject: ['attrition', 'corrosion'] })],
          }),
        ],
        guidance: 'Attrition wears down the load itself; abrasion is the load wearing down the channel.',
      }),
      shortParts({
        seconds: 110,
        stem: 'At one site a stream is 4.0 m wide, has a mean depth of 0.35 m and flows at a mean velocity of 0.60 m/s.',
        parts: [
          part({
            prompt: 'Calculate the cross-sectional area of the stream. Use area = width × mean depth.',
            answer: num(1.4, { unit: 'm²' }),
            answerLabel: 'Area =',
            recompute: () => 4.0 * 0.35,
            model: '1.4',
            points: ['1.4 (m²)'],
          }),
          part({
            prompt: 'Calculate the discharge of the stream.',
            lines: 2,
            answer: num(0.84, { unit: 'm³/s' }),
            answerLabel: 'Discharge =',
            recompute: () => 4.0 * 0.35 * 0.6,
            model: '0.84',
            points: ['Multiplies the cross-sectional area by the velocity', '0.84 (m³/s)'],
          }),
        ],
        guidance: 'Discharge is cross-sectional area multiplied by velocity: the volume passing a point each second.',
      }),
      short({
        seconds: 60,
        guidance: 'Lag time runs from peak rainfall to peak discharge. Thirty minutes is 0.5 of an hour, not 0.3.',
        stem: 'A storm hydrograph shows peak rainfall at 09:30 and peak discharge at 16:00 on the same day. Calculate the lag time in hours.',
        answerLabel: 'Lag time =',
        answer: num(6.5, { unit: 'hours' }),
        recompute: () => 16 - 9.5,
        model: '6.5',
        points: ['6.5 (hours)'],
      }),
      short({
        seconds: 75,
        stem: 'The River Ashlow falls 240 m over a distance of 16 km. Calculate its mean gradient in metres per kilometre.',
        lines: 2,
        answerLabel: 'Gradient =',
        answer: num(15, { unit: 'm per km' }),
        recompute: () => 240 / 16,
        model: '15',
        points: [r`$\dfrac{240}{16}$`, '15 (m per km)'],
      }),
      shortParts({
        seconds: 75,
        stem: 'Name the landform found at each part of a meander.',
        parts: [
          part({
            prompt: 'The gently sloping bank on the inside of the bend, where sand and pebbles are deposited',
            answer: words('slip-off slope', 'slip off slope', 'slip-off', 'slip-off bank', 'point bar', 'river beach'),
            model: 'slip-off slope',
            points: [point('slip-off slope', { allow: ['point bar', 'river beach'] })],
          }),
          part({
            prompt: 'The steep bank on the outside of the bend',
            answer: words('river cliff', 'cliff', 'bluff', 'cut bank', 'river bluff', 'undercut bank'),
            model: 'river cliff',
            points: [point('river cliff', { allow: ['cut bank', 'bluff'] })],
          }),
        ],
        guidance: 'Flow is fastest on the outside of the bend, so erosion happens there and deposition on the inside.',
      }),
      recall({
        seconds: 170,
        stem: 'Explain how a waterfall forms and moves upstream to leave a gorge.',
        lines: 8,
        points: [
          point('A layer of harder rock lies over softer rock, and the softer rock is eroded more quickly'),
          point('Hydraulic action or abrasion undercuts the hard rock, leaving an overhang', {
            allow: ['a plunge pool forms'],
          }),
          point('The overhang loses its support and collapses', { reject: ['the overhang is weathered away'] }),
          point('The process is repeated, so the waterfall retreats upstream and leaves a steep-sided gorge', {
            reject: ['retreats downstream'],
          }),
        ],
        model:
          'A river flows over hard rock that lies on top of softer rock. The softer rock is eroded faster, by hydraulic action and abrasion, so the hard rock is undercut and overhangs. The overhang collapses into the plunge pool. This is repeated many times, so the waterfall retreats upstream and leaves a steep-sided gorge.',
      }),
      recall({
        seconds: 160,
        stem: 'Explain how an ox-bow lake forms.',
        lines: 8,
        points: [
          point('Erosion on the outside of the bends makes the neck of a meander narrower'),
          point('In a flood the river breaks through the neck', { allow: ['cuts through the neck'] }),
          point('The river takes the straighter, shorter course'),
          point('Deposition seals off the ends of the old bend, leaving an ox-bow lake'),
        ],
        model:
          'Water flows fastest on the outside of the bends and erodes the banks, so the neck of the meander becomes narrower. In a flood the river cuts through the neck and follows the new, straighter course. Deposition seals the ends of the old meander, which is left as an ox-bow lake.',
        guidance: 'Both erosion and deposition are needed. Say where each one takes place.',
      }),
      recall({
        seconds: 120,
        guidance: 'Link each step to the next: surface, runoff, river. "Concrete causes floods" does not explain.',
        stem: 'Explain why building a town on farmland can increase the risk of a river flooding.',
        lines: 6,
        points: [
          point('Roads, roofs and pavements are impermeable, so less water soaks into the ground', {
            allow: ['less infiltration'],
          }),
          point('So more water flows over the surface, or through drains, to the river', {
            allow: ['more surface runoff', 'overland flow'],
          }),
          point('So water reaches the river more quickly and the peak discharge is higher', {
            allow: ['a shorter lag time'],
          }),
        ],
        model:
          'Roads and roofs are impermeable, so less rain infiltrates the soil. There is more surface runoff, and drains carry it quickly to the river. The lag time is shorter and the peak discharge is higher, so flooding is more likely.',
      }),
    ],
  },
];
