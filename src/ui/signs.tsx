import type { ReactElement, ReactNode } from 'react';

/*
 * The book's own signs, drawn in one stroke width on a field of 24. Each stands beside its word and says nothing by
 * itself to a screen reader.
 */

function Sign({ children }: { readonly children: ReactNode }): ReactElement {
  return (
    <svg
      className="sign"
      viewBox="0 0 24 24"
      width="24"
      height="24"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.75"
      strokeLinecap="square"
      strokeLinejoin="miter"
      aria-hidden="true"
      focusable="false"
    >
      {children}
    </svg>
  );
}

/** The earth strap: two ring terminals and the braid between them. */
export function StrapSign(): ReactElement {
  return (
    <Sign>
      <g transform="rotate(-45 12 12)" strokeLinecap="round">
        <circle cx="1.5" cy="12" r="3.4" />
        <circle cx="22.5" cy="12" r="3.4" />
        <path d="M5 12c1.2-3.2 2.3-3.2 3.5 0s2.3 3.2 3.5 0 2.3-3.2 3.5 0 2.3 3.2 3.5 0" />
        <path d="M5 12c1.2 3.2 2.3 3.2 3.5 0s2.3-3.2 3.5 0 2.3 3.2 3.5 0 2.3-3.2 3.5 0" />
      </g>
    </Sign>
  );
}

/** A lens. */
export function FindSign(): ReactElement {
  return (
    <Sign>
      <circle cx="10" cy="10" r="6.5" />
      <path d="M15 15l6 6M10 6.5a3.5 3.5 0 0 0-3.5 3.5" />
    </Sign>
  );
}

/** A frame with its two wheels, from the side. */
export function DonorsSign(): ReactElement {
  return (
    <Sign>
      <circle cx="5.5" cy="16" r="4" />
      <circle cx="18.5" cy="16" r="4" />
      <path d="M5.5 16l4-6.5h5l-3.5 6.5h-5.500M18.5 16l-4.5-9h3.5" />
    </Sign>
  );
}

/** A vice with something in it: what is on the bench. */
export function BenchSign(): ReactElement {
  return (
    <Sign>
      <path d="M2 13h20M5 13v8M19 13v8M7 13V8h3.500v5M13.5 13V8H17v5M10.5 6h3M12 3v10" />
    </Sign>
  );
}

/** A name plate. */
export function MemberSign(): ReactElement {
  return (
    <Sign>
      <path d="M3 5h18v14H3zM7 16c0-4 5-4 5 0" />
      <circle cx="9.5" cy="10" r="1.8" />
      <path d="M15 10h3M15 14h3" />
    </Sign>
  );
}

/** A sheet coming out of its slot. */
export function PrintSign(): ReactElement {
  return (
    <Sign>
      <path d="M2.5 10h19M6 10V3h12v7M6 10v11h12V10M9 14h6M9 17h6" />
    </Sign>
  );
}

/** A pen's stroke on a ruled line: write here. */
export function ProposeSign(): ReactElement {
  return (
    <Sign>
      <path d="M3 21h18M6 17l1-4L17 3l3 3L10 16zM14.5 5.500l3 3" />
    </Sign>
  );
}

/** Two links of one chain. */
export function LinkSign(): ReactElement {
  return (
    <Sign>
      <path d="M10 7H3v6h7M14 11h7v6h-7M8 10h3M13 14h3" />
    </Sign>
  );
}
