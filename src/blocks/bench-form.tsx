import type { ReactElement } from 'react';
import { Form } from 'react-router';
import type { SubjectSummary } from '../../shared/contracts/views.ts';
import { paths } from '../lib/paths.ts';
import { Button } from '../ui/button.tsx';
import { SelectField } from '../ui/field.tsx';

interface BenchFormProps {
  readonly donors: readonly SubjectSummary[];
  readonly chosen?: string | null;
  /** Where putting a donor on the bench leads back to. */
  readonly next: string;
}

/** Chooses which donor is on the bench. */
export function BenchForm({ donors, chosen = null, next }: BenchFormProps): ReactElement {
  return (
    <Form className="bench-form" method="post" action={paths.bench} preventScrollReset>
      <input type="hidden" name="next" value={next} />
      <SelectField label="Donor" name="donor" defaultValue={chosen ?? donors[0]?.slug}>
        {donors.map(({ slug, title, years }) => (
          <option key={slug} value={slug}>
            {years === null ? title : `${title}, ${years}`}
          </option>
        ))}
      </SelectField>
      <Button>Put it on the bench</Button>
    </Form>
  );
}
