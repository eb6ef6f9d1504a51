import type { MouseEvent, ReactElement, ReactNode } from 'react';
import { Outlet, useNavigation, type LoaderFunctionArgs } from 'react-router';
import { apiOf, prime } from '../lib/loading.ts';
import { viewerQuery } from '../lib/queries.ts';
import { useAnswer, useApi } from '../lib/use-api.ts';
import { BenchRail } from './bench-rail.tsx';
import { useFocusKeeper } from './focus-keeper.ts';
import { FootRail } from './foot-rail.tsx';
import { useScrollKeeper } from './scroll-keeper.ts';
import { ThumbRail } from './thumb-rail.tsx';

/** Who is signed in, for every sheet. */
export async function rootLoader({ context }: LoaderFunctionArgs): Promise<null> {
  await prime(context, viewerQuery(apiOf(context)));
  return null;
}

/** Every sheet with the bench rail round it. */
export function Root(): ReactElement {
  const viewer = useAnswer(viewerQuery(useApi()));
  return (
    <Surround rail={<BenchRail viewer={viewer} />} thumbs={<ThumbRail viewer={viewer} />}>
      <Outlet />
    </Surround>
  );
}

interface SurroundProps {
  readonly rail: ReactNode;
  readonly thumbs: ReactNode;
  readonly children: ReactNode;
}

function Surround({ rail, thumbs, children }: SurroundProps): ReactElement {
  useScrollKeeper();
  useFocusKeeper();
  const onItsWay = useNavigation().state !== 'idle';
  return (
    <>
      <a className="skip button" href="#sheet" onClick={skipToSheet}>
        Skip to the sheet
      </a>
      {onItsWay ? <div className="pending" /> : null}
      {rail}
      <div aria-busy={onItsWay}>{children}</div>
      <FootRail />
      {thumbs}
    </>
  );
}

function skipToSheet(event: MouseEvent): void {
  const sheet = document.getElementById('sheet');
  if (sheet === null) return;
  event.preventDefault();
  sheet.focus();
  sheet.scrollIntoView();
}
