import { data, redirect, type ActionFunctionArgs } from 'react-router';
import type { Api, Answer } from '../../../shared/contracts/api.ts';
import type { NoteBody, PublishBody } from '../../../shared/contracts/bodies.ts';
import type { ProposalView } from '../../../shared/contracts/views.ts';
import type { Problem } from '../../../shared/lib/problem.ts';
import { readText } from '../../lib/form-fields.ts';
import { apiOf } from '../../lib/loading.ts';
import { paths } from '../../lib/paths.ts';
import { keepAnswer } from './keep-answer.ts';
import { notesId } from './section-ids.ts';

/** What can be done on a proposal's sheet. */
const acts = ['note', 'send', 'withdraw', 'send-back', 'decline', 'publish'] as const;
export type ProposalAct = (typeof acts)[number];

/** What a form of the sheet is answered with where the book refuses. */
export interface ProposalOutcome {
  readonly act: ProposalAct;
  readonly problem: Problem;
  /** Every field as it was typed, by its name. */
  readonly values: Readonly<Record<string, string>>;
}

/** Does to a proposal what its form asks for, and shows what became of it. */
export async function proposalAction({ context, params, request }: ActionFunctionArgs) {
  const id = params['id'] ?? '';
  const form = await request.formData();
  const api = apiOf(context);
  const act = acts.find((one) => one === readText(form, 'do')) ?? 'note';
  const answer = await perform(api, id, act, form);
  if (answer.ok) {
    keepAnswer(context, api, answer.value);
    return redirect(paths.proposal(id) + (act === 'note' ? `#${notesId}` : ''));
  }
  const values = Object.fromEntries([...form.keys()].map((name) => [name, readText(form, name)]));
  const outcome: ProposalOutcome = { act, problem: answer.refusal, values };
  return data(outcome, { status: answer.refusal.status });
}

function perform(api: Api, id: string, act: ProposalAct, form: FormData): Answer<ProposalView> {
  switch (act) {
    case 'note':
      return api.addNote(id, readNote(form));
    case 'send':
      return api.send(id);
    case 'withdraw':
      return api.withdraw(id);
    case 'send-back':
      return api.sendBack(id, { note: readText(form, 'note') });
    case 'decline':
      return api.decline(id, { reason: readText(form, 'reason') });
    case 'publish':
      return api.publish(id, readPublication(form));
  }
}

/** A note is of the whole, of a line of the text by its number, or of a line of the page by its address. */
export function readNote(form: FormData): NoteBody {
  const text = readText(form, 'text');
  const about = readText(form, 'about')
    .trim()
    .replace(/^line\s+/i, '');
  if (about === '') return { text };
  return /^\d+$/.test(about)
    ? { text, line: Number(about) }
    : { text, address: about.startsWith('#') ? about : `#${about}` };
}

/** Which version was read, and a reason for each finding that is let through. */
export function readPublication(form: FormData): PublishBody {
  const overrides = overrideNumbers(form).map((number) => ({
    code: readText(form, `code-${number}`),
    address: readText(form, `address-${number}`) || null,
    reason: readText(form, `reason-${number}`).trim(),
  }));
  return { version: readText(form, 'version'), overrides: overrides.filter(({ reason }) => reason !== '') };
}

function overrideNumbers(form: FormData): string[] {
  return [...form.keys()].filter((name) => name.startsWith('code-')).map((name) => name.slice('code-'.length));
}
