import { expose, transfer } from 'comlink';
import { type Engine, prepare } from '../../shared/engine/engine.ts';
import { digestOf } from '../../shared/model/digest.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { answerDraft } from './answer-draft.ts';
import type { DraftSimulator, Reply } from './simulator.ts';

let ready: { key: string; engine: Engine } | null = null;

function engineFor(key: string): Engine {
  if (ready?.key !== key) throw new Error(`The document ${key} is not loaded.`);
  return ready.engine;
}

function reply<T>(work: () => T): Reply<T> {
  try {
    return { ok: true, value: work() };
  } catch (problem) {
    if (problem instanceof DocumentError) return { ok: false, issues: problem.issues };
    throw problem;
  }
}

const simulator: DraftSimulator = {
  load: (key, document) =>
    reply(() => {
      ready = null;
      ready = { key, engine: prepare(document) };
      return null;
    }),
  base: (key) => reply(() => engineFor(key).base({ trace: true })),
  draws: (key, settings, from, to) => {
    const answer = reply(() => engineFor(key).draws(settings, from, to));
    if (!answer.ok) return answer;
    const { cost, outcome } = answer.value;
    return transfer(
      answer,
      [...cost, ...outcome].map((column) => column.buffer),
    );
  },
  answer: answerDraft,
  digest: digestOf,
};

expose(simulator);
