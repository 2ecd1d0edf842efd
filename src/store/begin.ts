/** Ways to a new appraisal: a template, a file. Each gives the address to go to. */
import type { ModelDocument } from '../../shared/model/document.ts';
import type { Issue } from '../../shared/model/issue.ts';
import { TEMPLATES, type TemplateSlug } from '../../shared/model/templates/templates.ts';
import { templateWords } from '../i18n/template-words.ts';
import { createAppraisal } from './appraisals.ts';
import { importText } from './document-file.ts';
import type { Origin } from './new-appraisal.ts';
import { showDocument } from './open-sessions.ts';
import { getSettings } from './settings.ts';
import { StoreError } from './store-error.ts';

/** Where a document stands that this device cannot keep, until the page is closed. */
const UNKEPT = 'unkept';

export async function beginFromTemplate(slug: TemplateSlug): Promise<string> {
  const words = await templateWords(getSettings().language);
  const year = new Date().getFullYear();
  const { samples } = getSettings();
  const template = TEMPLATES[slug]({ id: slug, year, words });
  const document = { ...template, analysis: { ...template.analysis, samples } };
  const source = slug === 'empty' ? 'empty' : (`template:${slug}` as const);
  return orShown({ document, source }, async (origin) => (await createAppraisal(origin)).id);
}

export interface FromFile {
  /** Null where the text is refused: `issues` say why. */
  readonly address: string | null;
  readonly issues: readonly Issue[];
  /** What could be read of it, to say places by their names. */
  readonly document: ModelDocument | null;
}

export async function beginFromText(text: string): Promise<FromFile> {
  const { readDocument } = await import('../../shared/model/read.ts');
  const read = readDocument(text);
  const document = read.document ?? read.draft;
  const { issues } = read;
  if (!document) return { address: null, issues, document };
  const address = await orShown({ document, source: 'file' }, async () => {
    return (await importText(text)).appraisal?.id ?? UNKEPT;
  });
  return { address, issues, document };
}

/** Work goes on where nothing can be kept, and says so: it can still leave as a file. */
async function orShown(origin: Origin, make: (origin: Origin) => Promise<string>): Promise<string> {
  try {
    return await make(origin);
  } catch (problem) {
    if (!(problem instanceof StoreError)) throw problem;
    showDocument(UNKEPT, origin);
    return UNKEPT;
  }
}
