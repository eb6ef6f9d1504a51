import type { ReactElement } from 'react';
import { Link, NavLink, useLocation } from 'react-router';
import type { Viewer } from '../../shared/contracts/views.ts';
import { shelves } from '../../shared/pages/address.ts';
import { shelfLabels } from '../blocks/words.ts';
import { SearchField } from '../features/search/search-field.tsx';
import { paths } from '../lib/paths.ts';
import { StrapSign } from '../ui/signs.tsx';

/** Name, search (but where the sheet itself asks), shelves, bench and whoever is signed in, above every sheet. */
export function BenchRail({ viewer }: { readonly viewer: Viewer }): ReactElement {
  const { pathname } = useLocation();
  return (
    <header className="rail">
      <Link className="rail-name" to={paths.home}>
        <StrapSign /> Earthstrap
      </Link>
      <div className="rail-search">
        {pathname === paths.home ? null : <SearchField placement="rail" />}
      </div>
      <nav className="rail-places" aria-label="The book">
        {shelves.map((shelf) => (
          <NavLink key={shelf} className="rail-place" to={paths.shelf(shelf)}>
            {shelfLabels[shelf]}
          </NavLink>
        ))}
        <NavLink className="rail-place" to={paths.bench}>
          My bike
        </NavLink>
        {viewer.member === null ? (
          <NavLink className="rail-place" to={paths.signIn}>
            Sign in
          </NavLink>
        ) : (
          <>
            <NavLink className="rail-place" to={paths.proposals}>
              Proposals
            </NavLink>
            <NavLink className="rail-place" to={paths.account}>
              {viewer.member.name}
            </NavLink>
          </>
        )}
      </nav>
      {viewer.waiting === 0 ? null : (
        <Link className="rail-place rail-waiting" to={`${paths.proposals}?state=waiting`}>
          {viewer.waiting === 1 ? '1 waits for you' : `${String(viewer.waiting)} wait for you`}
        </Link>
      )}
    </header>
  );
}
