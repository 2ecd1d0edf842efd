/** Goes to a thing within a step, and to the thing itself once the step is in view. */
import { useCallback, useEffect } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';

/** The element of a thing that can be gone to; it takes the focus with `tabIndex` -1. */
export function placeOf(id: string): string {
  return `at-${id}`;
}

/** @returns goes to an address within the appraisal, and there to the thing with that id */
export function useSought(): (to: string, id: string) => void {
  const navigate = useNavigate();
  const { key, state } = useLocation();
  const sought: unknown = state?.sought;
  // biome-ignore lint/correctness/useExhaustiveDependencies: sought again when gone to again
  useEffect(() => {
    if (typeof sought !== 'string') return;
    const place = document.getElementById(placeOf(sought)) ?? document.getElementById('main');
    place?.scrollIntoView?.({ block: 'start' });
    place?.focus({ preventScroll: true });
  }, [key, sought]);
  return useCallback(
    (to, id) => void navigate(to, { state: { sought: id, keepFocus: true } }),
    [navigate],
  );
}
