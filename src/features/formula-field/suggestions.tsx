import { type RefObject, useLayoutEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { KnownName } from './formula-names.ts';

interface SuggestionsProps {
  readonly id: string;
  readonly options: readonly KnownName[];
  readonly active: number;
  readonly anchor: RefObject<HTMLElement | null>;
  readonly onChoose: (name: KnownName) => void;
}

export const optionId = (list: string, index: number) => `${list}-${index}`;

/** What the word at the caret can become; the keyboard stays with the field. */
export function Suggestions({ id, options, active, anchor, onChoose }: SuggestionsProps) {
  const { t } = useTranslation();
  const place = usePlaceBelow(anchor);
  useLayoutEffect(() => {
    const option = document.getElementById(optionId(id, active));
    option?.scrollIntoView?.({ block: 'nearest' });
  }, [id, active]);
  return (
    <div
      id={id}
      role="listbox"
      tabIndex={-1}
      aria-label={t('formulaField.suggestions')}
      style={place}
      className="fixed z-30 max-h-64 overflow-y-auto rounded-md border border-rule-strong bg-raised py-1 shadow-float"
    >
      {options.map((name, index) => (
        <div
          key={name.symbol}
          id={optionId(id, index)}
          role="option"
          tabIndex={-1}
          aria-selected={index === active}
          // The field keeps the focus: a press, not a click, is what would take it.
          onMouseDown={(event) => {
            event.preventDefault();
            onChoose(name);
          }}
          className="min-h-11 cursor-pointer px-3 py-1.5 aria-selected:bg-brass-soft"
        >
          <span className="font-bold break-words">{name.symbol}</span>
          {name.params && <span className="text-mute">({name.params.join(', ')})</span>}
          <span className="block text-sm text-mute">
            {[t(`formulaField.what.${name.what}`), name.label, name.unit]
              .filter((text) => text !== '')
              .join(' · ')}
          </span>
        </div>
      ))}
    </div>
  );
}

const WIDTH = 340;
const MARGIN = 8;
const HEIGHT = 264;

/** Below the field, or above it where there is no room; kept there while the page scrolls. */
function usePlaceBelow(anchor: RefObject<HTMLElement | null>) {
  const [place, setPlace] = useState({ left: 0, top: 0, width: WIDTH });
  useLayoutEffect(() => {
    const measure = () => {
      const box = anchor.current?.getBoundingClientRect();
      if (!box) return;
      const room = document.documentElement.clientWidth - 2 * MARGIN;
      const width = Math.min(WIDTH, Math.max(room, 200));
      const left = Math.max(MARGIN, Math.min(box.left, room + MARGIN - width));
      const below = box.bottom + 4;
      const isLow = below + HEIGHT > window.innerHeight && box.top > HEIGHT + 4;
      setPlace({ left, width, top: isLow ? box.top - HEIGHT - 4 : below });
    };
    measure();
    window.addEventListener('scroll', measure, { capture: true, passive: true });
    window.addEventListener('resize', measure);
    return () => {
      window.removeEventListener('scroll', measure, { capture: true });
      window.removeEventListener('resize', measure);
    };
  }, [anchor]);
  return place;
}
