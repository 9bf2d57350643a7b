const MATHS = /\$\$([\s\S]*?)\$\$|\$((?:\\.|[^$\\])+)\$/g;

/** LaTeX as somebody would type it into a search box: "\mathrm{CO}_2" reads "CO2". */
const plainMaths = (source: string): string =>
  source
    .replace(/\\[a-zA-Z]+/g, ' ')
    .replace(/\\(.)/g, '$1')
    .replace(/[{}_^~&]/g, '')
    .trim();

/** One spelling of quotation marks, spaces and capitals, for text and search alike. */
export const foldText = (text: string): string =>
  text
    .normalize('NFC')
    .replace(/[\u2018\u2019]/g, "'")
    .replace(/[\u201c\u201d]/g, '"')
    .replace(/\s+/g, ' ')
    .trim()
    .toLowerCase();

/**
 * Markdown as plain words in lower case, for searching. Formulas stand in the sentence without their commands, and
 * their LaTeX once more at the end, so that both "co2" and "\frac" find them.
 */
export function plainWords(markdown: string): string {
  const sources: string[] = [];
  const words = markdown
    .replace(MATHS, (_whole, display: string | undefined, inline: string | undefined) => {
      const source = display ?? inline ?? '';
      sources.push(source);
      return plainMaths(source);
    })
    .replace(/^\s{0,3}(?:#{1,6}\s|>\s?|[-+*]\s)/gm, '')
    .replace(/^[\s|:-]+$/gm, '')
    .replace(/\\([!-/:-@[-`{-~])/g, '$1')
    .replace(/[*`|]/g, ' ')
    .replace(/(?<!\w)_+|_+(?!\w)/g, ' ');
  return foldText([words, ...sources].join(' '));
}
