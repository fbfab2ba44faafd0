/** A page's path as it may stand in a log: without its query, and without a link's secret. */
export const loggedPath = (path: string): string =>
  path.split('?')[0]!.replace(/^\/(join|reset)\/.+/, '/$1/…');
