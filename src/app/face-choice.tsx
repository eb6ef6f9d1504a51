import { useSyncExternalStore, type ReactElement } from 'react';
import { redirect, useFetcher, useLocation, type ActionFunctionArgs } from 'react-router';
import { faceCookie } from '../lib/bench.ts';
import { keepCookies } from '../lib/cookies.ts';
import { readText, readWayBack } from '../lib/form-fields.ts';
import { paths } from '../lib/paths.ts';

const faces = [
  { face: 'system', word: 'As the system' },
  { face: 'paper', word: 'Paper' },
  { face: 'garage', word: 'Garage' },
] as const;

/** Keeps a reader's choice of face. In the browser the sheet takes it on at once; without a script it goes back there. */
export async function faceAction({ request }: ActionFunctionArgs): Promise<Response | null> {
  const form = await request.formData();
  const asked = readText(form, 'face');
  const face = asked === 'paper' || asked === 'garage' ? asked : null;
  const headers = keepCookies([faceCookie(face)]);
  if (typeof document === 'undefined') return redirect(readWayBack(form, paths.home), { headers });
  if (face === null) delete document.documentElement.dataset['face'];
  else document.documentElement.dataset['face'] = face;
  return null;
}

/** The choice between paper, garage and whatever the system says. */
export function FaceChoice(): ReactElement {
  const fetcher = useFetcher();
  const { pathname } = useLocation();
  const chosen = useFace();
  return (
    <fetcher.Form className="face-choice" method="post" action={paths.face}>
      <input type="hidden" name="next" value={pathname} />
      <span id="face-choice">Face</span>
      <div role="group" aria-labelledby="face-choice">
        {faces.map(({ face, word }) => (
          <button key={face} name="face" value={face} aria-pressed={chosen === face}>
            {word}
          </button>
        ))}
      </div>
    </fetcher.Form>
  );
}

/** The face that the document has; nobody knows it before the browser does. */
function useFace(): string | null {
  return useSyncExternalStore(
    (changed) => {
      const observer = new MutationObserver(changed);
      observer.observe(document.documentElement, { attributeFilter: ['data-face'] });
      return () => observer.disconnect();
    },
    () => document.documentElement.dataset['face'] ?? 'system',
    () => null,
  );
}
