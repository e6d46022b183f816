const fractions: Record<string, string> = {
  '½': '1/2', '⅓': '1/3', '⅔': '2/3', '¼': '1/4', '¾': '3/4', '⅛': '1/8', '⅜': '3/8', '⅝': '5/8', '⅞': '7/8',
};

/**
 * The same text in the signs of a plain keyboard, for a parser to read; what was typed is kept beside it. Phones turn the
 * marks for feet and inches into quotes, and spreadsheets paste spaces that do not break and fractions of one sign.
 */
export function plainTyping(text: string): string {
  return text
    .replace(/[½⅓⅔¼¾⅛⅜⅝⅞]/g, (sign) => ` ${fractions[sign]} `)
    .replace(/[\u00a0\u2000-\u200a\u202f\u3000]/g, ' ')
    .replace(/[’‘′]/g, "'")
    .replace(/[”“″]|''/g, '"')
    .replace(/\u2044/g, '/')
    .replace(/[−–]/g, '-')
    .trim();
}
