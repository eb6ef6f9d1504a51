import type { ReactElement } from 'react';
import { HomeSheet } from '../features/home/home-sheet.tsx';
import { SearchField } from '../features/search/search-field.tsx';

/** The home sheet with the search field in it: features do not know each other, so they meet here. */
export function HomePage(): ReactElement {
  return <HomeSheet searchField={<SearchField placement="home" />} />;
}
