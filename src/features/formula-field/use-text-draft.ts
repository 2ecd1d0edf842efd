/**
 * What a formula field shows while it is typed in. The text is the field's own: it is sent
 * on right after the keystroke is painted, so that no keystroke waits for the model, and
 * comes back a moment later.
 */
import { useEffect, useRef, useState } from 'react';

/** The text, and what to call when it is typed in. */
export function useTextDraft(
  value: string,
  send: (text: string) => void,
): readonly [string, (text: string) => void] {
  const [text, setText] = useState(value);
  const current = useRef(value);
  /** Sent, and not yet come back: a value that is among them is no news. */
  const sent = useRef<string[]>([]);
  useEffect(() => {
    const index = sent.current.indexOf(value);
    const isOurs = index >= 0 || current.current === value;
    sent.current = current.current === value ? [] : sent.current.slice(index + 1);
    if (isOurs) return;
    current.current = value;
    setText(value);
  }, [value]);
  const type = (typed: string) => {
    current.current = typed;
    setText(typed);
    sent.current.push(typed);
    setTimeout(() => send(typed), 0);
  };
  return [text, type];
}
