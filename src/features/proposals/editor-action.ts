import { data, redirect, type ActionFunctionArgs } from 'react-router';
import type { Api } from '../../../shared/contracts/api.ts';
import type { PreviewView, ProposalView } from '../../../shared/contracts/views.ts';
import { problem, type Problem } from '../../../shared/lib/problem.ts';
import { accept, refuse, type Result } from '../../../shared/lib/result.ts';
import { queryClientContext } from '../../lib/api-context.ts';
import { readText } from '../../lib/form-fields.ts';
import { apiOf, nothingHere } from '../../lib/loading.ts';
import { paths } from '../../lib/paths.ts';
import { previewBody, readEditorValues, type EditorValues } from './editor-values.ts';
import { browserDrawer } from './browser-drawer.ts';
import { forgetTexts } from './kept-texts.ts';
import { keepAnswer } from './keep-answer.ts';

/** A text as it would look. The id lets the page's state find its HTML where the document has it already. */
export type Preview = PreviewView & { readonly id: 'preview' };

/** What the editor's form is answered with where it does not lead on: all that was typed, and what there is to say of it. */
export interface EditorOutcome {
  readonly values: EditorValues;
  readonly problem: Problem | null;
  readonly preview: Preview | null;
  /** True where the session has ended: the form asks who one is, and goes on where it stood. */
  readonly needsSignIn: boolean;
}

/** Looks a text over, keeps it as a draft, or sends it to the moderators. */
export async function editorAction({ context, request }: ActionFunctionArgs) {
  const form = await request.formData();
  const values = readEditorValues(form);
  if (values === null) throw nothingHere();
  const api = apiOf(context);

  if (form.has('email')) {
    const refusal = await signInAgain(api, form);
    if (refusal !== null) return answer(values, refusal, null, true);
    if (!(await isSignedIn(api))) {
      // This door lets them in with the next request: the browser sends the same form once more.
      const url = new URL(request.url);
      if (!url.searchParams.has('again')) {
        url.searchParams.set('again', '');
        return redirect(url.pathname + url.search, 307);
      }
    }
    await context.get(queryClientContext).invalidateQueries({ queryKey: ['viewer'] });
  }

  const wanted = readText(form, 'do');
  if (wanted !== 'keep' && wanted !== 'send') {
    const looked = await api.preview(previewBody(values));
    return looked.ok ? answer(values, null, looked.value) : answer(values, looked.refusal, null);
  }

  const noAddress = addressMissing(values);
  if (noAddress !== null) return answer(values, noAddress, null);
  const written = await write(api, values);
  if (!written.ok) return answer(values, atItsField(written.refusal, values), null);
  const { id } = written.value;
  forgetTexts(browserDrawer(), values.keptAs, ({ markdown }) => markdown === values.markdown);

  if (wanted !== 'send' || values.waiting) return done(written);
  const sent = await api.send(id);
  // Written and not sent: whoever tries again goes on with the draft that there is now.
  return sent.ok ? done(sent) : answer({ ...values, proposal: id }, sent.refusal, null);

  function done({ value }: { readonly value: ProposalView }): Response {
    keepAnswer(context, api, value);
    return redirect(paths.proposal(value.id));
  }
}

function answer(values: EditorValues, refusal: Problem | null, view: PreviewView | null, needsSignIn = false) {
  const outcome: EditorOutcome = {
    values,
    problem: refusal,
    preview: view === null ? null : { ...view, id: 'preview' },
    needsSignIn: needsSignIn || refusal?.code === 'sign-in-needed',
  };
  return data(outcome, { status: refusal?.status ?? 200 });
}

async function isSignedIn(api: Api): Promise<boolean> {
  const viewer = await api.viewer();
  return viewer.ok && viewer.value.member !== null;
}

/** Signs in whoever is not yet; gives why that was refused. */
async function signInAgain(api: Api, form: FormData): Promise<Problem | null> {
  if (await isSignedIn(api)) return null;
  const signedIn = await api.signIn({ email: readText(form, 'email'), password: readText(form, 'password') });
  return signedIn.ok ? null : signedIn.refusal;
}

async function write(api: Api, values: EditorValues): Promise<Result<ProposalView, Problem>> {
  const { shelf, subject, page, baseRevision, markdown, summary, proposal } = values;
  const written =
    proposal === null
      ? await api.propose({ shelf, subject, page, baseRevision, markdown, summary })
      : await api.addVersion(proposal, { markdown, summary, baseRevision });
  return written.ok ? accept(written.value) : refuse(written.refusal);
}

/** A new page that has no address: its title suggests none, and nobody wrote one. */
function addressMissing({ proposal, subject, page }: EditorValues): Problem | null {
  if (proposal !== null || (subject !== '' && page !== '')) return null;
  return problem('fields-invalid', 'It has no address yet', 'Nothing was sent, and what you wrote is here.', {
    fields: {
      [subject === '' ? 'subject' : 'page']:
        'Write the title into the text, and an address is made of it; or write one here.',
    },
  });
}

/** An address that is taken is said where the address is written. */
function atItsField(refusal: Problem, { page }: EditorValues): Problem {
  if (refusal.code !== 'already-there') return refusal;
  return { ...refusal, fields: { [page === 'overview' ? 'subject' : 'page']: `${refusal.title}. Choose another.` } };
}
