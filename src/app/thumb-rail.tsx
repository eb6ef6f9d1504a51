import type { ReactElement } from 'react';
import { NavLink } from 'react-router';
import type { Viewer } from '../../shared/contracts/views.ts';
import { paths } from '../lib/paths.ts';
import { BenchSign, DonorsSign, FindSign, MemberSign } from '../ui/signs.tsx';

/** Four thumbs' width at the foot of a phone. */
export function ThumbRail({ viewer }: { readonly viewer: Viewer }): ReactElement {
  const places = [
    { to: paths.search(), word: 'Find', sign: <FindSign /> },
    { to: paths.shelf('donors'), word: 'Donors', sign: <DonorsSign /> },
    { to: paths.bench, word: 'My bike', sign: <BenchSign /> },
    { to: viewer.member === null ? paths.signIn : paths.account, word: 'Me', sign: <MemberSign /> },
  ];
  return (
    <nav className="thumbs" aria-label="At hand">
      {places.map(({ to, word, sign }) => (
        <NavLink key={word} className="thumb" to={to}>
          {sign}
          {word}
        </NavLink>
      ))}
    </nav>
  );
}
