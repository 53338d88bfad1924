import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';
import type { KindOfPart } from '../../features/parts/kindOfPart';

type Load<Loaded> = () => Promise<Loaded>;

const loadOpAmps = async () => (await import('../../features/parts/opAmps')).OP_AMPS;
const loadResistors = async () => (await import('../../features/parts/resistors')).RESISTORS;

/** The pages of every kind of part: its list, its forms and its parts. */
export const partsRoutes: RouteObject[] = [
  ...routesOf('parts', loadOpAmps, async () => (await import('./OpAmpPage')).OpAmpPage),
  ...routesOf('parts/resistors', loadResistors, async () => (await import('./ResistorPage')).ResistorPage),
];

function routesOf(path: string, loadKind: Load<KindOfPart>, loadPage: Load<ComponentType>): RouteObject[] {
  return [
    { path, lazy: pageOf(loadKind, async () => (await import('./PartsPage')).PartsPage) },
    {
      path: `${path}/completeness`,
      lazy: pageOf(loadKind, async () => (await import('./CompletenessPage')).CompletenessPage),
    },
    {
      path: `${path}/duplicates`,
      lazy: pageOf(loadKind, async () => (await import('./DuplicatesPage')).DuplicatesPage),
    },
    { path: `${path}/new`, lazy: pageOf(loadKind, async () => (await import('./NewPartPage')).NewPartPage) },
    { path: `${path}/:id`, lazy: async () => ({ Component: await loadPage() }) },
    {
      path: `${path}/:id/edit`,
      lazy: pageOf(loadKind, async () => (await import('./EditPartPage')).EditPartPage),
    },
  ];
}

/** A page of one kind; another kind's is another page, which keeps nothing of it. */
function pageOf(loadKind: Load<KindOfPart>, loadPage: Load<ComponentType<{ kind: KindOfPart }>>) {
  return async () => {
    const [kind, Page] = await Promise.all([loadKind(), loadPage()]);
    return { element: <Page key={kind.path} kind={kind} /> };
  };
}
