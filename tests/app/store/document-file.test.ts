import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../shared/model/digest.ts';
import { readDocument } from '../../../shared/model/read.ts';
import { exportName, exportText, importText } from '../../../src/store/document-file.ts';
import { exampleText, listExamples } from '../../../src/store/examples.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';
import { openTab, sessionOf, setValue } from './support.ts';

describe('a document as a file', () => {
  it.each(listExamples().map(({ slug }) => slug))('%s keeps its digest', async (slug) => {
    const db = openTab();
    const text = (await exampleText(slug)) ?? '';
    const { appraisal, issues } = await importText(text, db);
    expect(issues.filter(({ severity }) => severity === 'error')).toEqual([]);
    expect(appraisal?.source).toBe('file');
    const session = await sessionOf(db, appraisal?.id ?? '');
    const digest = digestOf(readDocument(text).document);
    expect(digestOf(session.getState().document)).toBe(digest);
    const parameter = session.getState().document.parameters[0]?.id ?? '';
    await session.edit(setValue(parameter, 0.123), 'Value');
    const out = await exportText(session.getState().document);
    const back = await importText(out, db);
    const again = await sessionOf(db, back.appraisal?.id ?? '');
    expect(digestOf(again.getState().document)).toBe(digestOf(session.getState().document));
    expect(await exportText(again.getState().document)).toBe(out);
  });

  it('is refused with every reason, and nothing is made', async () => {
    const db = openTab();
    const { appraisal, issues } = await importText('{"format": "other"}', db);
    expect(appraisal).toBeNull();
    expect(issues.map(({ code }) => code)).toEqual(['document.wrongFormat']);
    expect(await db.appraisals.count()).toBe(0);
  });

  it('is taken in to be mended where only a reference is broken', async () => {
    const db = openTab();
    const broken = tinyDocument();
    const question = { ...broken.question, comparator: 'nobody' };
    const { appraisal, issues } = await importText(await exportText({ ...broken, question }), db);
    expect(issues.some(({ severity }) => severity === 'error')).toBe(true);
    const session = await sessionOf(db, appraisal?.id ?? '');
    expect(session.getState().document.question.comparator).toBe('nobody');
  });

  it('has a name that every system takes', () => {
    const named = (title: string) =>
      exportName({ ...tinyDocument(), question: { ...tinyDocument().question, title } });
    expect(named('Le dépistage: à quel prix?')).toBe('le-depistage-a-quel-prix.json');
    expect(named('???')).toBe('appraisal.json');
    expect(exportName({ ...tinyDocument(), question: null as never })).toBe('appraisal.json');
  });
});
