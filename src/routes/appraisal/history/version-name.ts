import type { TFunction } from 'i18next';
import type { VersionRow } from '../../../store/database.ts';

/** The name it was given, else what was said of it, else what it is. */
export function versionName({ name, message, parents }: VersionRow, t: TFunction): string {
  return name || message || t(parents.length === 0 ? 'history.first' : 'history.unnamed');
}
