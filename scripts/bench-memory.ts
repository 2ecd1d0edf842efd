/** Prints the peak resident memory of a probabilistic run; run by bench.ts in its own process. */
import { readFileSync } from 'node:fs';
import { prepare } from '../shared/engine/engine.ts';
import { readDocument } from '../shared/model/read.ts';

const megabytes = (kilobytes: number) => kilobytes / 1024;

const samples = Number(process.argv[2]);
const text = readFileSync('shared/examples/keeping-hearts-well.json', 'utf8');
const { document } = readDocument(text);
if (!document) throw new Error('the example cannot be read');
const baseline = megabytes(process.resourceUsage().maxRSS);
prepare(document).draws({ samples, seed: 1, plan: 'plain' }, 0, samples);
const peak = megabytes(process.resourceUsage().maxRSS);
console.log(JSON.stringify({ peakMegabytes: peak, baselineMegabytes: baseline }));
