import { num, part, point, recall, short, shortParts, type TopicContent, wording, words } from './build.ts';
import { exactly } from './exact-words.ts';

const elizabethRule: TopicContent = {
  number: '7',
  title: 'Elizabeth I: government and religion, 1558–1569',
  weights: { 2: 14 },
  questions: [
    short({
      seconds: 35,
      stem: 'In which year did Elizabeth I become queen?',
      answer: num(1558),
      model: '1558',
      points: ['1558'],
    }),
    shortParts({
      seconds: 80,
      stem: 'These questions are about the religious settlement of 1559.',
      parts: [
        part({
          prompt: 'Name the Act that restored the monarch’s authority over the Church of England.',
          answer: exactly(
            ['Act of Supremacy', 'the Act of Supremacy', 'Supremacy Act', 'Supremacy', 'Act of Supremacy 1559'],
            ['Act of Uniformity', 'Act of Succession'],
          ),
          model: 'Act of Supremacy',
          points: [point('The Act of Supremacy', { reject: ['Act of Uniformity'] })],
        }),
        part({
          prompt: 'Name the Act that required one prayer book to be used in every church.',
          answer: exactly(
            ['Act of Uniformity', 'the Act of Uniformity', 'Uniformity Act', 'Uniformity', 'Act of Uniformity 1559'],
            ['Act of Supremacy'],
          ),
          model: 'Act of Uniformity',
          points: [point('The Act of Uniformity', { reject: ['Act of Supremacy'] })],
        }),
        part({
          prompt: 'State the title that Elizabeth took as head of the Church.',
          answer: exactly(
            [
              'Supreme Governor',
              'Supreme Governor of the Church of England',
              'Supreme Governor of the Church',
              'the Supreme Governor',
              'Governor',
              'Governor of the Church',
              'Governor of the Church of England',
            ],
            [
              'Supreme Head',
              'Supreme Head of the Church',
              'Supreme Head of the Church of England',
              'Defender of the Faith',
              'Archbishop of Canterbury',
            ],
          ),
          model: 'Supreme Governor',
          points: [point('Supreme Governor', { allow: ['Governor'], reject: ['Supreme Head'] })],
        }),
      ],
      guidance:
        'Henry VIII was *Supreme Head*. Elizabeth chose *Governor*, which those who would not accept a woman as head could bear.',
    }),
    short({
      seconds: 40,
      stem: 'Name the man whom Elizabeth made her Secretary of State in 1558 and Lord Treasurer in 1572.',
      answer: exactly(
        [
          'William Cecil',
          'Cecil',
          'Sir William Cecil',
          'Burghley',
          'Lord Burghley',
          'Baron Burghley',
          'Lord Burleigh',
          'Burleigh',
        ],
        ['Robert Cecil', 'Robert Dudley', 'Walsingham', 'Francis Walsingham'],
      ),
      model: 'William Cecil',
      points: [
        point('(William) Cecil', {
          allow: ['Lord Burghley, his title from 1571'],
          reject: ['Robert Cecil, his son', 'Walsingham'],
        }),
      ],
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain four problems that Elizabeth I faced when she became queen.',
      points: [
        point('Legitimacy: Catholics did not recognise her parents’ marriage, so her right to rule was questioned', {
          allow: ['she had been declared illegitimate'],
        }),
        point(
          'Gender: many thought that a woman should not rule alone, and she was under pressure to marry and have an heir',
          { allow: ['the succession was uncertain'] },
        ),
        point('Religion: the country was divided between Catholics and Protestants', {
          allow: ['after the changes under Edward and Mary'],
        }),
        point('Money or foreign threat: the Crown was in debt, or France and Scotland were hostile', {
          allow: ['Mary, Queen of Scots, had a claim to the throne', 'loss of Calais'],
        }),
      ],
      model:
        'Catholics did not accept that her parents had been lawfully married, so her right to the throne was questioned. Many people thought a woman could not rule alone, and she was expected to marry and have an heir. The country was divided between Catholics and Protestants. The Crown was in debt, and France, linked by marriage to Scotland, was a threat.',
      guidance: 'Naming a problem is not explaining it: add why it made her position weak.',
    }),
    recall({
      seconds: 120,
      lines: 6,
      stem: 'Describe three features of the religious settlement, or of church services after it, that Puritans disliked.',
      points: [
        point('Priests had to wear special clothing, or vestments', { allow: ['the surplice'] }),
        point('Crucifixes, candles, music or other decorations were allowed in some churches', {
          allow: ['ornaments'],
        }),
        point('Bishops remained in charge of the Church', {
          allow: ['the Church kept its hierarchy', 'saints’ days', 'making the sign of the cross at baptism'],
        }),
      ],
      model:
        'Puritans disliked the rule that clergy must wear vestments such as the surplice, which reminded them of Catholic priests. They objected to crucifixes and other ornaments in churches. They also disliked the Church still being governed by bishops.',
    }),
  ],
};

const elizabethThreats: TopicContent = {
  number: '8',
  title: 'Plots, Spain and the Armada, 1569–1588',
  weights: { 2: 16 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'Name the plot against Elizabeth I discovered in each year.',
      parts: [
        part({
          prompt: '1571',
          answer: exactly(
            ['Ridolfi Plot', 'Ridolfi', 'the Ridolfi Plot'],
            ['Babington', 'Throckmorton', 'Babington Plot', 'Throckmorton Plot'],
          ),
          model: 'Ridolfi Plot',
          points: ['The Ridolfi Plot'],
        }),
        part({
          prompt: '1583',
          answer: exactly(
            ['Throckmorton Plot', 'Throckmorton', 'the Throckmorton Plot'],
            ['Babington', 'Ridolfi', 'Babington Plot', 'Ridolfi Plot'],
          ),
          model: 'Throckmorton Plot',
          points: ['The Throckmorton Plot'],
        }),
        part({
          prompt: '1586',
          answer: exactly(
            ['Babington Plot', 'Babington', 'the Babington Plot'],
            ['Throckmorton', 'Ridolfi', 'Throckmorton Plot', 'Ridolfi Plot'],
          ),
          model: 'Babington Plot',
          points: ['The Babington Plot'],
        }),
      ],
      guidance: 'Ridolfi, Throckmorton, Babington. The last of them led to the execution of Mary, Queen of Scots.',
    }),
    short({
      seconds: 35,
      stem: 'In which year was Mary, Queen of Scots, executed?',
      answer: num(1587),
      model: '1587',
      points: [point('1587', { reject: ['1588'] })],
      guidance: 'February 1587, the year before the Armada.',
    }),
    short({
      seconds: 35,
      stem: 'Name Elizabeth I’s principal secretary who ran the network of spies that uncovered the Babington Plot.',
      answer: words('Francis Walsingham', 'Walsingham', 'Sir Francis Walsingham'),
      model: 'Francis Walsingham',
      points: [point('(Sir Francis) Walsingham', { reject: ['Cecil'] })],
    }),
    short({
      seconds: 40,
      stem: 'Name the Spanish port that Drake raided in 1587, destroying ships and supplies meant for the Armada.',
      answer: exactly(['Cadiz', 'Cádiz'], ['Calais', 'Lisbon', 'Gravelines']),
      model: 'Cadiz',
      points: [point('Cadiz', { reject: ['Calais'] })],
      guidance: 'The raid, “the singeing of the King of Spain’s beard”, delayed the Armada by about a year.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain four reasons why the Spanish Armada of 1588 failed.',
      points: [
        point('English fireships at Calais broke up the Armada’s formation', {
          allow: ['the Spanish cut their anchor cables'],
        }),
        point('English ships were faster or easier to handle, or their guns could be reloaded more quickly', {
          allow: ['the battle of Gravelines'],
        }),
        point('The Duke of Parma’s army was not ready, or could not reach the Spanish ships', {
          allow: ['poor communication', 'no deep-water port'],
        }),
        point('Storms wrecked many ships on the voyage home round Scotland and Ireland', {
          allow: ['bad weather', 'lack of supplies', 'Medina Sidonia’s inexperience'],
        }),
      ],
      model:
        'English fireships sent in at Calais made the Spanish ships scatter and lose their formation. At Gravelines the English ships were easier to handle and could fire more quickly. Parma’s army was not ready to be carried across the Channel, so the plan could not work. On the way home round Scotland and Ireland storms wrecked many of the Spanish ships.',
      guidance:
        'Cover English action, Spanish planning and the weather. Weather alone cannot explain the defeat at Gravelines.',
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain why relations between England and Spain grew worse in the years before 1588.',
      points: [
        point('Religion: Philip II was Catholic and Elizabeth’s England was Protestant', {
          allow: ['the Pope excommunicated Elizabeth in 1570'],
        }),
        point('English privateers such as Drake robbed Spanish ships and ports', {
          allow: ['Elizabeth knighted Drake'],
        }),
        point('Elizabeth helped Dutch Protestants who rebelled against Spain, and sent an army in 1585', {
          allow: ['Treaty of Nonsuch', 'Leicester’s army'],
        }),
        point('Spain was involved in plots to replace Elizabeth, and Mary, Queen of Scots, was executed', {
          allow: ['Throckmorton Plot'],
        }),
      ],
      model:
        'Philip II was a Catholic ruler and Elizabeth a Protestant one whom the Pope had excommunicated. English privateers such as Drake attacked Spanish treasure ships, and Elizabeth rewarded them. In 1585 she sent an army to help Dutch Protestants who were rebelling against Spain. Spain had supported plots against her, and the execution of Mary, Queen of Scots, in 1587 angered Catholic Europe.',
      guidance: 'Give each cause a fact: a name, a treaty or a date.',
    }),
  ],
};

const elizabethSociety: TopicContent = {
  number: '9',
  title: 'Elizabethan society and exploration',
  weights: { 2: 10 },
  questions: [
    shortParts({
      seconds: 70,
      stem: 'These questions are about Drake’s voyage round the world.',
      parts: [
        part({
          prompt: 'Name the ship in which he returned.',
          answer: words('Golden Hind', 'the Golden Hind', 'Golden Hinde', 'Pelican', 'the Golden Hinde'),
          model: 'Golden Hind',
          points: [point('The *Golden Hind*', { allow: ['*Pelican*, her first name'] })],
        }),
        part({
          prompt: 'State the year of his return.',
          answer: num(1580),
          model: '1580',
          points: ['1580'],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'Name the island on which the colony promoted by Walter Raleigh was set up in 1585.',
      answer: words('Roanoke', 'Roanoke Island', 'the island of Roanoke'),
      model: 'Roanoke',
      points: [point('Roanoke', { reject: ['Virginia, the name of the wider territory', 'Jamestown'] })],
    }),
    short({
      seconds: 40,
      stem: 'State the term used by Elizabethans for homeless people without work who wandered from place to place and were feared as criminals.',
      answer: wording(
        'vagabonds',
        'vagabond',
        'vagrants',
        'vagrant',
        'sturdy beggars',
        'vagabonds and vagrants',
        'sturdy beggar',
        'rogues and vagabonds',
        'the idle poor',
        'the undeserving poor',
      ),
      model: 'vagabonds',
      points: [
        point('Vagabonds', {
          allow: ['vagrants', 'sturdy beggars', 'the idle poor'],
          reject: ['the deserving poor', 'beggars, alone'],
        }),
      ],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Explain four reasons why poverty grew in Elizabethan England.',
      points: [
        point('The population rose, so there was more competition for work and food', {
          allow: ['wages fell behind prices'],
        }),
        point('Prices rose, or bad harvests made food expensive', {
          allow: ['inflation', 'the harvests of the 1590s'],
        }),
        point('Land was enclosed for sheep, so farm workers lost work or common land', {
          allow: ['fewer labourers were needed'],
        }),
        point('The cloth trade declined at times, or monasteries were no longer there to help the poor', {
          allow: ['trade embargoes with Spain', 'rack-renting'],
        }),
      ],
      model:
        'The population grew, so more people competed for work and food. Prices rose, and bad harvests made bread more expensive. Landowners enclosed fields for sheep, which needed fewer workers. The cloth trade was interrupted by quarrels with Spain, and the monasteries that had once helped the poor had been closed.',
      guidance: 'Say how each change left someone without work, land or food.',
    }),
    recall({
      seconds: 130,
      lines: 6,
      stem: 'Explain why the theatre was popular in Elizabethan London, and why some people opposed it.',
      points: [
        point('It was cheap enough for most people: standing in the yard cost about a penny', {
          allow: ['groundlings'],
        }),
        point('Rich people supported it as patrons of companies', {
          allow: ['the Queen enjoyed plays', 'new purpose-built theatres from the 1570s'],
        }),
        point('Puritans thought it sinful or ungodly', {
          allow: ['a distraction from church', 'linked with drinking and gambling'],
        }),
        point('The authorities feared crime, disorder or the spread of plague in crowds', {
          allow: ['theatres were built outside the City’s control'],
        }),
      ],
      model:
        'Plays were cheap, since groundlings could stand in the yard for about a penny, and rich patrons supported companies of actors. Puritans opposed the theatre as sinful and a distraction from church. The City authorities feared that crowds would bring crime, disorder and plague.',
      guidance: 'Two sides, two reasons each.',
    }),
  ],
};

const weimar: TopicContent = {
  number: '10',
  title: 'The Weimar Republic, 1918–1929',
  weights: { 2: 14 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'These questions are about the Treaty of Versailles (1919).',
      parts: [
        part({
          prompt: 'State the largest number of men that the treaty allowed in the German army.',
          answer: num(100000, { unit: 'men' }),
          answerLabel: 'Number of men =',
          model: '100000',
          points: ['100,000'],
        }),
        part({
          prompt:
            'Give the name by which Article 231, which made Germany accept responsibility for the war, is usually known.',
          answer: words('War Guilt Clause', 'the War Guilt Clause', 'war guilt', 'guilt clause', 'war guilt article'),
          model: 'War Guilt Clause',
          points: ['The War Guilt Clause'],
        }),
        part({
          prompt: 'State the term for the payments that Germany had to make to the Allies.',
          answer: words('reparations', 'reparation', 'reparation payments', 'war reparations'),
          model: 'reparations',
          points: [point('Reparations', { reject: ['repatriations'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'Name the first President of the Weimar Republic.',
      answer: exactly(['Friedrich Ebert', 'Ebert'], ['Hindenburg', 'Stresemann', 'Scheidemann', 'Paul von Hindenburg']),
      model: 'Friedrich Ebert',
      points: [point('(Friedrich) Ebert', { reject: ['Hindenburg'] })],
    }),
    short({
      seconds: 35,
      stem: 'Hyperinflation in Germany reached its height after French and Belgian troops occupied the Ruhr. State the year.',
      answer: num(1923),
      model: '1923',
      points: ['1923'],
    }),
    short({
      seconds: 40,
      stem: 'Name the new currency introduced in Germany in November 1923 to end hyperinflation.',
      answer: exactly(['Rentenmark', 'the Rentenmark', 'Rentenmarks'], ['Reichsmark', 'Deutschmark', 'Papiermark']),
      model: 'Rentenmark',
      points: [point('Rentenmark', { reject: ['Reichsmark, which followed in 1924'] })],
      guidance: 'The Rentenmark came first, in November 1923; the Reichsmark replaced it in 1924.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain how the occupation of the Ruhr led to hyperinflation in Germany.',
      points: [
        point('Germany fell behind with reparations, so French and Belgian troops occupied the Ruhr in January 1923', {
          allow: ['to take goods instead of money'],
        }),
        point('German workers went on strike: passive resistance', { allow: ['they refused to co-operate'] }),
        point('The government paid the strikers while goods and taxes from the Ruhr were lost', {
          allow: ['industrial production fell'],
        }),
        point('It printed more and more money, so money lost its value and prices soared', {
          allow: ['savings became worthless'],
        }),
      ],
      model:
        'When Germany fell behind with reparations, French and Belgian troops occupied the Ruhr in January 1923. German workers there went on strike in passive resistance. The government went on paying them although it had lost the Ruhr’s industry and taxes. It printed more and more money to do so, and prices soared as the mark lost its value.',
      guidance:
        'Follow the chain: missed payment, occupation, strike, printing, prices. Leaving out a link loses the mark for it.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Describe four ways in which Stresemann helped Germany to recover between 1923 and 1929.',
      points: [
        point('He introduced the Rentenmark, a stable currency', {
          allow: ['ended hyperinflation', 'called off passive resistance'],
        }),
        point('The Dawes Plan (1924) brought American loans and made reparations easier to pay', {
          reject: ['the plan cancelled reparations'],
        }),
        point('The Locarno Pact (1925) improved relations with France and settled Germany’s western borders', {
          allow: ['Germany joined the League of Nations in 1926'],
        }),
        point('The Young Plan (1929) reduced the total of reparations', { allow: ['Kellogg–Briand Pact (1928)'] }),
      ],
      model:
        'Stresemann replaced the worthless mark with the Rentenmark in 1923. The Dawes Plan of 1924 brought American loans and made reparations easier to pay. By the Locarno Pact of 1925 Germany accepted its western borders, which improved relations with France. The Young Plan of 1929 reduced the total of reparations.',
      guidance: 'Take two at home or with money (Rentenmark, Dawes) and two abroad (Locarno, Young).',
    }),
  ],
};

const naziRise: TopicContent = {
  number: '11',
  title: 'Hitler’s rise to power, 1919–1933',
  weights: { 2: 16 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'These questions are about the early years of the Nazi Party.',
      parts: [
        part({
          prompt: 'Name the city in which Hitler tried to seize power in November 1923.',
          answer: exactly(['Munich', 'München'], ['Berlin', 'Nuremberg', 'Vienna']),
          model: 'Munich',
          points: [point('Munich', { reject: ['Berlin', 'Nuremberg'] })],
        }),
        part({
          prompt: 'Name the book in which he set out his ideas, begun while he was in prison.',
          answer: words('Mein Kampf', 'My Struggle'),
          model: 'Mein Kampf',
          points: [point('*Mein Kampf*', { allow: ['*My Struggle*'] })],
        }),
        part({
          prompt: 'Give the two-letter name of the Nazi stormtroopers, or “Brownshirts”.',
          answer: exactly(['SA', 'the SA', 'S.A.', 'S.A', 'Sturmabteilung'], ['SS', 'the SS', 'SD', 'S.S.']),
          model: 'SA',
          points: [point('SA', { allow: ['Sturmabteilung'], reject: ['SS'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'Name the event of October 1929 that began an economic depression and led American banks to call in their loans to Germany.',
      answer: words(
        'Wall Street Crash',
        'the Wall Street Crash',
        'Wall St Crash',
        'stock market crash',
        'the stock market crash',
        'Wall Street stock market crash',
        'Crash of 1929',
        'the Great Crash',
        'the Crash',
        'Wall Street collapse',
        'collapse of Wall Street',
        'stock exchange crash',
        'Black Tuesday',
        'Black Thursday',
      ),
      model: 'the Wall Street Crash',
      points: [point('The Wall Street Crash', { reject: ['the Great Depression, which followed'] })],
    }),
    short({
      seconds: 40,
      stem: 'Article 48 of the Weimar constitution was used often after 1930. Who could use it to rule by decree?',
      answer: exactly(
        [
          'the President',
          'President',
          'President Hindenburg',
          'Hindenburg',
          'the German President',
          'the Reich President',
          'Reich President',
          'the President of Germany',
          'Paul von Hindenburg',
        ],
        ['Chancellor', 'the Chancellor', 'Hitler', 'the Reichstag', 'Reichstag'],
      ),
      model: 'the President',
      points: [point('The President', { allow: ['Hindenburg'], reject: ['the Chancellor'] })],
      guidance:
        'Chancellors such as Brüning had no majority in the Reichstag, so they governed through the President’s decrees.',
    }),
    short({
      seconds: 35,
      stem: 'In January of which year was Hitler appointed Chancellor of Germany?',
      answer: num(1933),
      model: '1933',
      points: ['1933'],
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain how the Depression helped the Nazis to win support between 1929 and 1932.',
      points: [
        point('Unemployment rose to about six million, and the Nazis promised work', { allow: ['“work and bread”'] }),
        point('Weimar governments could not agree and seemed weak, so people turned to a strong leader', {
          allow: ['rule by decree', 'cuts in benefits'],
        }),
        point('Fear of communism grew, so the middle classes and business supported the Nazis', {
          allow: ['the communist vote rose too'],
        }),
        point('Nazi propaganda and organisation used people’s anger', {
          allow: ['rallies, posters, Hitler’s speeches', 'the SA looked disciplined'],
        }),
      ],
      model:
        'Unemployment rose to about six million, and the Nazis promised work and bread. Weimar governments seemed too weak and divided to act, so many people wanted a strong leader. The communists also gained votes, and fear of them led business owners and the middle classes to support Hitler. Nazi posters, rallies and speeches made use of people’s anger.',
      guidance: 'Each reason needs its link to votes. Unemployment alone does not explain why people chose the Nazis.',
    }),
    recall({
      seconds: 150,
      lines: 8,
      stem: 'Explain how Hitler came to be appointed Chancellor in January 1933.',
      points: [
        point('The Nazis were the largest party in the Reichstag after the elections of 1932', {
          reject: ['the Nazis had a majority of seats'],
        }),
        point('Papen and then Schleicher failed to govern with the Reichstag’s support', {
          allow: ['neither had a majority'],
        }),
        point('Papen made a deal with Hitler and persuaded Hindenburg to appoint him', {
          allow: ['Papen would be Vice-Chancellor'],
        }),
        point('They thought that they could control Hitler, with only a few Nazis in the cabinet', {
          allow: ['they wanted to use Nazi support'],
        }),
      ],
      model:
        'After the elections of 1932 the Nazis were the largest party in the Reichstag, although without a majority. Neither Papen nor Schleicher could govern with its support. Papen made a deal with Hitler and persuaded Hindenburg to appoint him Chancellor, with Papen as Vice-Chancellor. They believed that a cabinet with few Nazis in it could control him.',
      guidance: 'Hitler was appointed, not elected, to the office. Say who made the deal and why.',
    }),
  ],
};

const naziGermany: TopicContent = {
  number: '12',
  title: 'Nazi control and life in Germany, 1933–1939',
  weights: { 2: 14 },
  questions: [
    shortParts({
      seconds: 80,
      stem: 'These questions are about how Hitler became a dictator.',
      parts: [
        part({
          prompt: 'Name the building that was set on fire in February 1933.',
          answer: words(
            'Reichstag',
            'the Reichstag',
            'Reichstag building',
            'the Reichstag building',
            'German parliament',
            'the German parliament building',
            'the parliament building',
            'parliament',
          ),
          model: 'the Reichstag',
          points: ['The Reichstag'],
        }),
        part({
          prompt:
            'Name the law of March 1933 that let Hitler’s government make laws without the consent of parliament.',
          answer: words(
            'Enabling Act',
            'the Enabling Act',
            'Enabling Law',
            'the Enabling Law',
            'Enabling Act 1933',
            'Enabling',
          ),
          model: 'the Enabling Act',
          points: ['The Enabling Act'],
        }),
        part({
          prompt: 'Give the name by which the killing of SA leaders in June 1934 is known.',
          answer: exactly(
            [
              'Night of the Long Knives',
              'the Night of the Long Knives',
              'Röhm Purge',
              'Rohm Purge',
              'Roehm Purge',
              'Night of Long Knives',
              'Röhm Putsch',
              'Rohm Putsch',
              'Blood Purge',
              'Operation Hummingbird',
            ],
            ['Night of Broken Glass', 'Kristallnacht', 'Munich Putsch'],
          ),
          model: 'Night of the Long Knives',
          points: [point('The Night of the Long Knives', { reject: ['Kristallnacht'] })],
        }),
      ],
    }),
    short({
      seconds: 40,
      stem: 'Name the leader of the SS from 1929.',
      answer: exactly(['Heinrich Himmler', 'Himmler'], ['Röhm', 'Goebbels', 'Göring', 'Heydrich', 'Ernst Röhm']),
      model: 'Heinrich Himmler',
      points: [point('(Heinrich) Himmler', { reject: ['Röhm, leader of the SA'] })],
      guidance: 'Himmler led the SS; Röhm led the SA until he was killed in 1934.',
    }),
    short({
      seconds: 40,
      stem: 'Name the laws of September 1935 that took German citizenship from Jewish people and banned their marriage to non-Jewish Germans.',
      answer: words(
        'Nuremberg Laws',
        'the Nuremberg Laws',
        'Nuremberg',
        'Nuremburg Laws',
        'Nuremberg Race Laws',
        'the Nuremberg Race Laws',
        'Nürnberg Laws',
      ),
      model: 'the Nuremberg Laws',
      points: ['The Nuremberg Laws'],
    }),
    short({
      seconds: 40,
      stem: 'On 9–10 November 1938 Jewish homes, shops and synagogues across Germany were attacked. Give one of the names by which this is known.',
      answer: words(
        'Kristallnacht',
        'Night of Broken Glass',
        'the Night of Broken Glass',
        'Crystal Night',
        'November Pogrom',
        'the November Pogrom',
        'November Pogroms',
        'Reichskristallnacht',
        'Reichspogromnacht',
        'Night of the Broken Glass',
      ),
      model: 'Kristallnacht',
      points: [
        point('Kristallnacht', {
          allow: ['Night of Broken Glass', 'November Pogrom'],
          reject: ['Night of the Long Knives'],
        }),
      ],
    }),
    recall({
      seconds: 140,
      lines: 7,
      stem: 'Describe four methods of propaganda or censorship that Goebbels and the Nazi government used after 1933.',
      points: [
        point('Cheap radios were sold, and speeches were broadcast', { allow: ['loudspeakers in public places'] }),
        point('Rallies and spectacles were held, such as those at Nuremberg', { allow: ['the 1936 Olympics'] }),
        point('Newspapers were controlled: editors were told what to print and opponents’ papers closed', {
          allow: ['press censorship'],
        }),
        point('Books, films, art or music that the Nazis disapproved of were banned or burned', {
          allow: ['book burning in May 1933', 'the Reich Chamber of Culture', 'propaganda posters and films'],
        }),
      ],
      model:
        'Cheap radios were sold so that Hitler’s speeches could be heard in every home. Huge rallies were held at Nuremberg. Newspapers were told what to print, and those that opposed the Nazis were closed. Books by Jewish and other authors whom the Nazis condemned were burned, and films and art were censored.',
      guidance: 'Cover both: spreading the Nazi message, and stopping other messages.',
    }),
    recall({
      seconds: 130,
      lines: 7,
      stem: 'Describe four ways in which Nazi policy affected women in Germany in the 1930s.',
      points: [
        point(
          'Married women or professional women were pushed out of jobs such as teaching, medicine and the civil service',
          { allow: ['banned from being judges in 1936'] },
        ),
        point('Marriage loans were given to couples when the wife gave up work, and reduced for each child', {
          allow: ['Law for the Encouragement of Marriage, 1933'],
        }),
        point('Medals such as the Mother’s Cross rewarded large families', { allow: ['from 1938'] }),
        point('Women were expected to look after home and children and to live by a Nazi ideal', {
          allow: [
            '“children, kitchen, church”',
            'plain dress, no smoking',
            'girls trained in the League of German Maidens',
          ],
        }),
      ],
      model:
        'Many professional women lost their jobs in the civil service, medicine and teaching. Couples were offered marriage loans if the wife gave up work, and part was cancelled for each child. Mothers of large families were given the Mother’s Cross. Propaganda told women that their place was with “children, kitchen and church”.',
      guidance: 'Describe questions want precise facts. “Women were treated badly” earns nothing until you say how.',
    }),
  ],
};

export const paperTwoTopics: TopicContent[] = [
  elizabethRule,
  elizabethThreats,
  elizabethSociety,
  weimar,
  naziRise,
  naziGermany,
];
