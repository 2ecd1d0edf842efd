/** What the primary outcome is called: the standard measures in the reader's language. */
import type { TFunction } from 'i18next';
import type { Question } from '../../shared/model/document.ts';

export interface OutcomeWords {
  /** As counted, such as "QALYs" or "DALYs". */
  readonly plural: string;
  /** What there can be more of, such as "QALYs gained" or "DALYs averted". */
  readonly gained: string;
  /** The opposite, such as "QALYs given up" or "DALYs added". */
  readonly lost: string;
  /** What a threshold is per, such as "QALY" or "DALY averted". */
  readonly per: string;
}

export function outcomeWords({ outcome }: Question, t: TFunction): OutcomeWords {
  const known = outcome.measure === 'natural' ? null : outcome.measure;
  const plural = known ? t(`outcome.${known}.plural`) : outcome.unit;
  const singular = known ? t(`outcome.${known}.singular`) : outcome.unitSingular;
  if (outcome.direction === 'moreIsBetter') {
    return {
      plural,
      gained: known ? t(`outcome.${known}.gained`) : t('outcome.gained', { unit: plural }),
      lost: known ? t(`outcome.${known}.lost`) : t('outcome.lost', { unit: plural }),
      per: singular,
    };
  }
  return {
    plural,
    gained: known === 'daly' ? t('outcome.daly.gained') : t('outcome.averted', { unit: plural }),
    lost: known === 'daly' ? t('outcome.daly.lost') : t('outcome.added', { unit: plural }),
    per: known === 'daly' ? t('outcome.daly.per') : t('outcome.avertedOne', { unit: singular }),
  };
}
