/** The parts of a document that a model under test does not care about. */

import type { z } from 'zod';
import { documentSchema, type ModelDocument } from '../../shared/model/document.ts';

export type DocumentInput = z.input<typeof documentSchema>;

const SOURCE = { citation: 'Invented for a test', invented: true };

export function question(part: Partial<DocumentInput['question']>): DocumentInput['question'] {
  return {
    title: 'A model under test',
    population: 'nobody',
    perspective: 'health service',
    setting: 'Kesanda',
    horizon: 10,
    cycleLength: 1,
    discounting: { costs: 0, outcomes: 0 },
    counting: 'start',
    thresholds: [{ id: 'main', label: 'Main', value: 1000 }],
    currency: { code: 'XTS', symbol: 'KM', priceYear: 2026 },
    outcome: {
      measure: 'qaly',
      unit: 'QALYs',
      unitSingular: 'QALY',
      direction: 'moreIsBetter',
    },
    comparator: 's1',
    ...part,
  };
}

/** A fixed parameter whose id is its symbol. */
export function fixed(symbol: string, value: number): DocumentInput['parameters'][number] {
  return parameter(symbol, value, { type: 'fixed' });
}

export function parameter(
  symbol: string,
  value: number,
  distribution: DocumentInput['parameters'][number]['distribution'],
  kind: DocumentInput['parameters'][number]['kind'] = 'number',
): DocumentInput['parameters'][number] {
  return { id: symbol, symbol, label: symbol, unit: '', kind, value, distribution, source: SOURCE };
}

/** A document of format 1 from the parts that matter. */
export function documentOf(
  parts: Omit<DocumentInput, 'format' | 'formatVersion' | 'id' | 'about'>,
): ModelDocument {
  return documentSchema.parse({
    format: 'steelyard/model',
    formatVersion: 1,
    id: 'under-test',
    about: { invented: true },
    ...parts,
  });
}
