import type { ReactElement } from 'react';
import { Form } from 'react-router';
import { paths } from '../lib/paths.ts';
import { Button } from '../ui/button.tsx';

/** The one search field of the bench rail. */
export function SearchSlot(): ReactElement {
  return (
    <Form role="search" action={paths.search()} className="search-slot">
      <input className="field-control" name="q" type="search" aria-label="Search the book" />
      <Button>Find</Button>
    </Form>
  );
}
