/** The first part of every address that is a page; anything else is answered as not found, with the page that says so. */
const places = new Set([
  '',
  'sign-in',
  'forgotten-password',
  'new-password',
  'new-workshop',
  'found',
  'join',
  'choose-workshop',
  'people',
  'workshop',
  'profile',
  'jobs',
  'clients',
  'estimates',
  'rates',
  'programme',
  'bench',
  'documents',
  'invoices',
  'accounts',
  'leaf',
  'history',
  'letters',
  'client',
]);

/** Whether an address is one of the application's pages. */
export const isPage = (path: string): boolean => places.has(path.split('/')[1] ?? '');
