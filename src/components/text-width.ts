/**
 * About how wide a text is in Atkinson Hyperlegible, in px: enough to keep labels apart
 * without asking the page to lay them out first. Digits all have one width.
 */
export function textWidth(text: string, size = 14, bold = false): number {
  let em = 0;
  for (const character of text) em += widthOf(character);
  return em * size * (bold ? 1.06 : 1);
}

function widthOf(character: string): number {
  if (/\d/.test(character)) return 0.64;
  if (/[ijlI.,:;'|!]/.test(character)) return 0.28;
  if (/[\sfrt\-()]/.test(character)) return 0.36;
  if (/[mwMW]/.test(character)) return 0.86;
  return /\p{Lu}/u.test(character) ? 0.66 : 0.56;
}
