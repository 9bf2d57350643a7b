const LANGUAGE =
  /^(?:Arabic|Bengali|Chinese|English|French|German|Greek|Hebrew|Irish|Italian|Japanese|Latin|Polish|Portuguese|Russian|Spanish|Urdu|Welsh)\b/;

/** A subject's name inside a sentence: "chemistry", but "English literature". */
export const subjectWords = (name: string): string =>
  LANGUAGE.test(name) || /^[A-Z]{2}/.test(name) ? name : name.charAt(0).toLowerCase() + name.slice(1);

/** BCP 47 tag of a subject's questions where they are not in English. */
export const subjectLang = ({ strand }: { strand: string }): string | undefined => (strand === 'fr' ? 'fr' : undefined);
