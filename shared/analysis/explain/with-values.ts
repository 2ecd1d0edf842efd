/** A formula's text with values put in place of its names. */
import type { Explained } from './formula.ts';

/**
 * Names of tables stay. Values below 0 stand in brackets within a larger formula.
 * @param write writes one number, as the reader's language does
 */
export function withValues(
  text: string,
  explained: Explained,
  write: (value: number) => string,
): string {
  const alone = explained.type === 'name';
  let result = '';
  let end = 0;
  for (const { at, value } of namesOf(explained)) {
    const written = write(value);
    result += text.slice(end, at.start) + (value < 0 && !alone ? `(${written})` : written);
    end = at.end;
  }
  return result + text.slice(end);
}

/** In order of the text. */
function namesOf(part: Explained): Explained[] {
  if (part.type === 'name') return [part];
  if (part.type === 'number') return [];
  return part.args.flatMap(namesOf);
}
