import type { RouteObject } from 'react-router';

/** The sheets of what is on its way to publication. None is needed for reading, so each comes when it is asked for. */
export const proposalRoutes: RouteObject[] = [
  {
    path: 'proposals',
    id: 'proposals',
    lazy: async () => {
      const [{ proposalsLoader }, { ProposalsSheet }] = await Promise.all([
        import('./proposals-loader.ts'),
        import('./proposals-sheet.tsx'),
      ]);
      return { loader: proposalsLoader, Component: ProposalsSheet };
    },
  },
  {
    path: 'proposals/:id',
    id: 'proposal',
    lazy: async () => {
      const [{ proposalLoader }, { proposalAction }, { ProposalSheet }] = await Promise.all([
        import('./proposal-loader.ts'),
        import('./proposal-action.ts'),
        import('./proposal-sheet.tsx'),
      ]);
      return { loader: proposalLoader, action: proposalAction, Component: ProposalSheet };
    },
  },
  {
    path: 'proposals/:id/revise',
    id: 'revise',
    lazy: async () => {
      const [{ reviseLoader }, { editorAction }, { ReviseSheet }] = await Promise.all([
        import('./editor-loaders.ts'),
        import('./editor-action.ts'),
        import('./revise-sheet.tsx'),
      ]);
      return { loader: reviseLoader, action: editorAction, Component: ReviseSheet };
    },
  },
  {
    path: ':shelf/new',
    id: 'new-subject',
    lazy: async () => {
      const { newSubjectLoader, editorAction, NewSubjectSheet } = await editor();
      return { loader: newSubjectLoader, action: editorAction, Component: NewSubjectSheet };
    },
  },
  {
    path: ':shelf/:subject/new',
    id: 'new-page',
    lazy: async () => {
      const { newPageLoader, editorAction, NewPageSheet } = await editor();
      return { loader: newPageLoader, action: editorAction, Component: NewPageSheet };
    },
  },
  {
    path: ':shelf/:subject/:page/propose',
    id: 'propose',
    lazy: async () => {
      const { changeLoader, editorAction, ChangeSheet } = await editor();
      return { loader: changeLoader, action: editorAction, Component: ChangeSheet };
    },
  },
];

async function editor() {
  const [loaders, action, sheets] = await Promise.all([
    import('./editor-loaders.ts'),
    import('./editor-action.ts'),
    import('./editor-sheets.tsx'),
  ]);
  const { ChangeSheet, NewSubjectSheet, NewPageSheet } = sheets;
  return { ...loaders, ...action, ChangeSheet, NewSubjectSheet, NewPageSheet };
}
