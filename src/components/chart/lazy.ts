/** Charts are fetched when the first is shown. */
import { lazy } from 'react';

export const LazyLines = lazy(async () => ({ default: (await import('./lines.tsx')).Lines }));
export const LazyStack = lazy(async () => ({ default: (await import('./stack.tsx')).Stack }));
export const LazyBars = lazy(async () => ({ default: (await import('./bars.tsx')).Bars }));
export const LazyClouds = lazy(async () => ({ default: (await import('./cloud.tsx')).Clouds }));
