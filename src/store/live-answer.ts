/**
 * The answer that follows the draft: checks and base case at every edit, then the draws.
 * The latest draft wins; while it is broken there are issues and no numbers.
 */
import { useEffect, useState, useSyncExternalStore } from 'react';
import type { BaseRun } from '../../shared/engine/results.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { DocumentError, error, hasErrors, type Issue } from '../../shared/model/issue.ts';
import { type Answerer, appAnswerer } from '../workers/answerer.ts';
import { type Comparison, compare } from './answer.ts';
import { type DrawsState, drawDocument } from './draws.ts';
import { keepResults, keptResults } from './results-cache.ts';

/** A whole model and what came of it. */
export interface Answered {
  /** As it was run: defaults filled in. */
  readonly document: ModelDocument;
  readonly base: BaseRun;
  readonly comparison: Comparison;
  readonly draws: DrawsState;
}

export interface LiveState {
  /** Null while the model is broken, and before the first answer. */
  readonly now: Answered | null;
  /** Before the last step that changed anything; the last whole one while it is broken. */
  readonly was: Answered | null;
  /** Of the last draft that was checked, errors and warnings, those of the draws too. */
  readonly issues: readonly Issue[];
  /** A newer draft than these tell of is being looked into. */
  readonly working: boolean;
}

interface Asked {
  readonly document: ModelDocument;
  readonly step: number;
}

/** How the draws of a document are made; told of their progress. */
type DrawDocument = typeof drawDocument;

export class LiveAnswer {
  private state: LiveState = { now: null, was: null, issues: [], working: false };
  private asked: Asked | null = null;
  private busy = false;
  /** The last whole answer, and the step that it belongs to. */
  private last: { readonly answered: Answered; readonly step: number } | null = null;
  private drawing: AbortController | null = null;
  private readonly listeners = new Set<() => void>();

  constructor(
    private readonly answerer: Answerer,
    private readonly draw: DrawDocument = drawDocument,
    private readonly cache = { kept: keptResults, keep: keepResults },
  ) {}

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly getState = (): LiveState => this.state;

  /**
   * Asks for the answer of a draft; the same object again asks nothing.
   * @param step as the session counts: keystrokes of one step share their `was`
   */
  ask(document: ModelDocument, step: number): void {
    if (this.asked?.document === document) return;
    this.asked = { document, step };
    this.drawing?.abort();
    this.change({ working: true });
    if (!this.busy) void this.follow();
  }

  /** Makes the draws of the answer in view, again or after a stop. */
  readonly run = (): void => {
    const { now, working } = this.state;
    if (now && !working) void this.drawn(now);
  };

  /** Stops the draws. */
  readonly stop = (): void => {
    this.drawing?.abort();
    const { now } = this.state;
    if (now?.draws.status !== 'running') return;
    this.change({ now: { ...now, draws: { ...now.draws, status: 'stopped' } } });
  };

  /** Gives up what is under way, until something is asked again. */
  leave(): void {
    this.asked = null;
    this.drawing?.abort();
  }

  private async follow(): Promise<void> {
    this.busy = true;
    for (let asked = this.asked; asked; asked = this.asked === asked ? null : this.asked) {
      const found = await this.look(asked.document);
      if (this.asked !== asked) continue;
      this.take(asked, found);
    }
    this.busy = false;
  }

  private async look(draft: ModelDocument): Promise<{ issues: readonly Issue[]; whole: Whole }> {
    try {
      const { document, issues, base } = await this.answerer.answer(draft);
      if (!document || !base) return { issues, whole: null };
      return { issues, whole: { document, base, comparison: compare(document, base) } };
    } catch (problem) {
      const issues = problem instanceof DocumentError ? problem.issues : [error('run.brokeDown')];
      return { issues, whole: null };
    }
  }

  private take({ step }: Asked, found: { issues: readonly Issue[]; whole: Whole }): void {
    const { issues, whole } = found;
    const before = this.last;
    const was = before && before.step !== step ? before.answered : this.state.was;
    if (!whole || hasErrors(issues)) {
      this.change({ now: null, was, issues, working: false });
      return;
    }
    const now: Answered = { ...whole, draws: { status: 'none' } };
    this.last = { answered: now, step };
    this.change({ now, was, issues, working: false });
    void this.drawn(now);
  }

  private async drawn(answered: Answered): Promise<void> {
    this.drawing?.abort();
    const mine = new AbortController();
    this.drawing = mine;
    const { document, base } = answered;
    const settings = document.analysis;
    if (settings.samples === 0) return;
    const tell = (draws: DrawsState) => {
      if (!mine.signal.aborted) this.tellDraws(document, draws);
    };
    tell({ status: 'running', done: 0, total: settings.samples });
    const digest = await this.answerer.digest(document).catch(() => null);
    const kept = digest && (await this.cache.kept(digest, settings));
    if (mine.signal.aborted) return;
    if (kept) return tell({ status: 'done', draws: kept.draws, problems: kept.problems });
    const state = await this.draw(document, mine.signal, tell);
    tell(state);
    if (state.status !== 'done' || digest === null || mine.signal.aborted) return;
    const { draws, problems } = state;
    await this.cache.keep(digest, settings, { base, draws, problems });
  }

  private tellDraws(document: ModelDocument, draws: DrawsState): void {
    const { now, issues } = this.state;
    if (now?.document !== document) return;
    const answered = { ...now, draws };
    if (this.last) this.last = { ...this.last, answered };
    const shown = draws.status === 'done' ? [...issues, ...draws.problems] : issues;
    this.change({ now: answered, issues: shown });
  }

  private change(change: Partial<LiveState>): void {
    this.state = { ...this.state, ...change };
    for (const listener of this.listeners) listener();
  }
}

type Whole = Omit<Answered, 'draws'> | null;

/** The live answer of a session: one for the life of the component. */
export function useLiveAnswer(
  document: ModelDocument,
  step: number,
): LiveState & Pick<LiveAnswer, 'run' | 'stop'> {
  const [live] = useState(() => new LiveAnswer(appAnswerer()));
  useEffect(() => () => live.leave(), [live]);
  useEffect(() => live.ask(document, step), [live, document, step]);
  const state = useSyncExternalStore(live.subscribe, live.getState);
  return { ...state, run: live.run, stop: live.stop };
}
