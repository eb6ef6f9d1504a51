import type { ReactElement } from 'react';

interface MeasureBarProps {
  readonly value: number;
  readonly of: number;
  /** The number with its noun: the bar says nothing that the words do not. */
  readonly words: string;
}

/** A thin ruled bar with its number beside it. */
export function MeasureBar({ value, of, words }: MeasureBarProps): ReactElement {
  const share = of <= 0 ? 0 : Math.min(1, Math.max(0, value / of));
  return (
    <span className="measure-bar">
      <svg viewBox="0 0 100 10" preserveAspectRatio="none" aria-hidden="true" focusable="false">
        <rect
          x="0"
          y="0"
          width="100"
          height="10"
          fill="none"
          stroke="currentColor"
          strokeWidth="1"
          vectorEffect="non-scaling-stroke"
        />
        <rect x="0" y="0" width={share * 100} height="10" fill="currentColor" />
      </svg>
      <span>{words}</span>
    </span>
  );
}
