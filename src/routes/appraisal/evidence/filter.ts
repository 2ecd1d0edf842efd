/** Which parameters of the register are shown. */
import type { Parameter } from '../../../../shared/model/document.ts';
import type { Issue } from '../../../../shared/model/issue.ts';
import type { Language } from '../../../store/settings.ts';

export const FILTERS = ['all', 'uncertain', 'fixed', 'noSource', 'issues'] as const;
export type Filter = (typeof FILTERS)[number];

/** Parameters whose name, symbol or source holds what is sought, whatever the case. */
export function sought(
  parameters: readonly Parameter[],
  issues: readonly Issue[],
  text: string,
  filter: Filter,
  language: Language,
): Parameter[] {
  const plain = (one: string) => one.toLocaleLowerCase(language);
  const key = plain(text.trim());
  const broken = new Set(
    issues.filter(({ path }) => path[0] === 'parameters').map(({ path }) => path[1]),
  );
  return parameters.filter((parameter, index) => {
    const { label, symbol, source } = parameter;
    if (!isKept(parameter, filter, broken.has(index))) return false;
    return key === '' || [label, symbol, source.citation].some((one) => plain(one).includes(key));
  });
}

function isKept({ distribution, source }: Parameter, filter: Filter, hasIssues: boolean): boolean {
  switch (filter) {
    case 'all':
      return true;
    case 'uncertain':
      return distribution.type !== 'fixed';
    case 'fixed':
      return distribution.type === 'fixed';
    case 'noSource':
      return source.citation.trim() === '';
    case 'issues':
      return hasIssues;
  }
}
