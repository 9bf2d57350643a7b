/** The 180 students of Year 11. Invented; the family name is the last word. */
export const STUDENT_NAMES = `
Abigail Fenwick, Alfie Barraclough, Amber Tickell, Archie Penhallow, Bethan Maddocks, Bradley Osgood, Caitlin Heron,
Charlie Wadsworth, Chloe Birtles, Connor Dunleavy, Daisy Larkin, Dylan Treharne, Edie Copeland, Eleanor Haigh,
Ellis Braithwaite, Erin McAteer, Evie Stanforth, Finley Garside, Florence Upton, Freddie Lomax, Freya Sandiford,
George Ollerton, Grace Whitlock, Harriet Beswick, Harvey Sugden, Heidi Marlowe, Holly Entwistle, Imogen Tasker,
Isaac Rowbottom, Isla Drummond, Jack Hepworth, Jacob Treloar, Jasmine Kershaw, Joe Attwater, Josie Bickerton,
Kian Gilhooly, Lacey Thorburn, Lewis Auchterlonie, Libby Cropper, Logan Muirhead, Lola Pettifer, Lucas Standish,
Maisie Holroyd, Martha Eastoe, Max Ridding, Megan Pryce-Owen, Millie Gaskin, Nathan Clough, Niamh Devaney,
Noah Kettering, Oliver Brocklehurst, Oscar Fothergill, Phoebe Nuttall, Reece Danby, Reuben Levene, Rosie Applegarth,
Ruby Tordoff, Sam Winstanley, Scarlett Mabey, Seren Bevan-Pugh, Sid Quarmby, Sophie Ackroyd, Stanley Pym,
Summer Haddow, Theo Marchbank, Toby Inglesant, Tilly Rushworth, Will Satterthwaite, Zach Orme, Owen Cadwallader,
Eira Prothero, Tom Blenkinsop, Aaliyah Mahmood, Abdullah Chaudhry, Amina Khatun, Anaya Patel, Arjun Deshmukh,
Ayaan Siddiqui, Bilal Mirza, Dhruv Solanki, Diya Raghavan, Eesha Kulkarni, Faizan Baig, Fatima Choudhury,
Gurpreet Dhaliwal, Hamza Shafiq, Hardeep Sangha, Humaira Begum, Ibrahim Miah, Inaya Akhtar, Ishaan Trivedi,
Jasleen Bhogal, Kavya Nambiar, Mahira Ashraf, Manveer Gill, Maryam Zaman, Meera Selvarajah, Mohammed Uddin,
Nabila Haque, Nikhil Bhatt, Pavan Johal, Rayyan Malik, Rohan Wickramasinghe, Safa Hussain, Simran Kalsi,
Tahmid Islam, Yusuf Anwar, Zara Iqbal, Abena Owusu, Adaeze Nwosu, Ayomide Fashola, Blessing Chukwu, Chidi Ezekwe,
Daniel Asante, Destiny Campbell-Reid, Efua Mensah-Boateng, Elijah Prendergast, Emmanuel Adjei, Esther Kamara,
Fikayo Adeleke, Hodan Warsame, Ifrah Abdi, Israel Mukendi, Jayden Francis, Joanna Tetteh, Kaya Morrison-Blake,
Khadija Jalloh, Liban Farah, Makeda Tesfaye, Malachi Grant, Naomi Ncube, Nyasha Chikwanha, Obinna Uche, Rahma Osman,
Ruth Gebremedhin, Samuel Kiplagat, Tanisha Brathwaite, Temi Ogunbiyi, Chun Yin Lau, Jia Hui Tan, Kai Nakagawa-Wells,
Linh Tran, Mei Zhou, Minh Pham, Angelo Bautista, Hui Min Ong, Jasper Cheung, Trisha Villanueva, Ali Karimi,
Bahar Aksoy, Darya Ahmadi, Emre Kaplan, Hiba Nasser, Leila Farhadi, Rojin Demir, Yousef Khalil, Adrian Popescu,
Aleksandra Wróbel, Andrei Munteanu, Bianca Moldovan, Emilija Petrauskaitė, Filip Jaworski, Gabriela Nunes,
Ioana Drăgan, Jakub Sikora, Karolina Zielak, Kristers Ozoliņš, Lena Bondarenko, Luca Ferrante, Maks Wojtas,
Mateus Carvalho, Natalia Górska, Nikola Stoyanov, Oleh Tkachenko, Paola Restrepo, Rafael Quintana, Sofiya Melnyk,
Tiago Lourenço, Viktor Hristov, Zuzanna Pawlik
`
  .split(',')
  .map((name) => name.trim());

/** "Zuzanna Pawlik" → "Pawlik, Zuzanna"; "Ms C. Hallworth" → "Hallworth, Ms C.". */
export function sortName(name: string): string {
  const space = name.lastIndexOf(' ');
  return `${name.slice(space + 1)}, ${name.slice(0, space)}`;
}

/** Lower case without accents, a full stop between the words: "kristers.ozolins". */
export const usernameFor = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z-]+/g, '.');
