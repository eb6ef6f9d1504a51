import type { SubjectSummary } from '../../../shared/contracts/views.ts';

/** Four questions that show what may be asked; one of them of a bike that this book has. */
export function examplesFor(donors: readonly SubjectSummary[]): string[] {
  const donor = donors[0];
  const model = donor?.model ?? donor?.title;
  return [
    'yellow with a red tracer',
    model === undefined ? 'headlight connector' : `${model} headlight`,
    'where the starter relay earths',
    'pickup coil resistance',
  ];
}
