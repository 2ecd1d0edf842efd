/** Documents that explanations are tried on: every worked example and the small one. */
import { prepare } from '../../../shared/engine/engine.ts';
import type { BaseRun } from '../../../shared/engine/results.ts';
import { EXAMPLE_SLUGS } from '../../../shared/examples/slugs.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { exampleOf } from '../../examples/load.ts';
import { tinyDocument } from '../../fixtures/tiny-document.ts';

export interface Case {
  readonly name: string;
  readonly document: ModelDocument;
  /** With its trace. */
  readonly base: BaseRun;
}

export const CASES: readonly Case[] = [
  ...EXAMPLE_SLUGS.map((slug) => ({ name: slug as string, document: exampleOf(slug) })),
  { name: 'tiny', document: tinyDocument() },
].map((one) => ({ ...one, base: prepare(one.document).base({ trace: true }) }));

/** |got - want| <= tolerance * max(1, |want|), as an error of one number. */
export function off(got: number, want: number): number {
  return Math.abs(got - want) / Math.max(1, Math.abs(want));
}
