import type { ReactElement } from 'react';
import { Form, Link } from 'react-router';
import type { VariantChoices } from '../../shared/contracts/views.ts';
import type { SubjectAddress } from '../../shared/pages/address.ts';
import type { Variant } from '../../shared/pages/applicability.ts';
import { isAnyVariant, variantWords } from '../lib/bench.ts';
import { paths } from '../lib/paths.ts';
import { Button } from '../ui/button.tsx';
import { classNames } from '../ui/class-names.ts';
import { SelectField } from '../ui/field.tsx';

interface VariantChooserProps {
  readonly subject: SubjectAddress;
  readonly variant: Variant;
  readonly choices: VariantChoices;
  /** The path of the sheet that it stands on, without a query: where choosing leads back to. */
  readonly path: string;
  /** True where choosing is what the sheet is for. */
  readonly open?: boolean;
}

/** Which bike of a donor is on the bench: its year, market and frame. Choosing keeps it in the address and on the bench. */
export function VariantChooser({
  subject,
  variant,
  choices,
  path,
  open = false,
}: VariantChooserProps): ReactElement | null {
  if (subject.shelf !== 'donors') return null;
  if (choices.years === null && choices.markets.length === 0 && choices.frames.length === 0) return null;
  const words = variantWords(variant);
  return (
    <details className={classNames('variant-chooser plate', words !== null && 'variant-chosen')} open={open}>
      <summary>{words === null ? 'Which one is yours?' : `Shown for ${words}`}</summary>
      <Form method="post" action={paths.bench} preventScrollReset>
        <input type="hidden" name="donor" value={subject.subject} />
        <input type="hidden" name="next" value={path} />
        {/* Keyed by what is shown, so that a choice made elsewhere arrives in the fields too. */}
        <div className="variant-chooser-fields" key={words ?? ''}>
          {choices.years === null ? null : (
            <SelectField label="Year" name="year" defaultValue={variant.year ?? ''}>
              <option value="">any</option>
              {yearsOf(choices.years).map((year) => (
                <option key={year}>{year}</option>
              ))}
            </SelectField>
          )}
          <NameField label="Market" name="market" names={choices.markets} chosen={variant.market} />
          <NameField label="Frame" name="frame" names={choices.frames} chosen={variant.frame} />
        </div>
        <p className="button-row">
          <Button>Put it on the bench</Button>
          {isAnyVariant(variant) || path === paths.bench ? null : (
            <Link to={`${path}?year=`} className="button-beside">
              Show every year
            </Link>
          )}
        </p>
      </Form>
    </details>
  );
}

interface NameFieldProps {
  readonly label: string;
  readonly name: string;
  readonly names: readonly string[];
  readonly chosen: string | null;
}

function NameField({ label, name, names, chosen }: NameFieldProps): ReactElement | null {
  if (names.length === 0) return null;
  return (
    <SelectField label={label} name={name} defaultValue={chosen ?? ''}>
      <option value="">any</option>
      {names.map((one) => (
        <option key={one}>{one}</option>
      ))}
    </SelectField>
  );
}

function yearsOf({ from, to }: { readonly from: number; readonly to: number }): number[] {
  return Array.from({ length: to - from + 1 }, (_, index) => from + index);
}
