import { useEditing } from '../editing/context.tsx';

/** States by their labels, as they are called on screen. */
export function useStateName(): (id: string) => string {
  const { document } = useEditing();
  const labels = new Map(document.states.map(({ id, label }) => [id, label]));
  return (id) => labels.get(id) || id;
}

/** Strategies by their labels; their ids where a label is empty. */
export function useStrategyName(): (id: string) => string {
  const { document } = useEditing();
  const labels = new Map(document.strategies.map(({ id, label }) => [id, label]));
  return (id) => labels.get(id) || id;
}
