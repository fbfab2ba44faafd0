import { RequestError } from './request-error';

/**
 * The calls to the server about revisions, with their schemas, once one is made: a first paint
 * needs none. @throws RequestError offline
 */
export async function loadRevisions(): Promise<typeof import('./revisions')> {
  try {
    return await import('./revisions');
  } catch {
    throw new RequestError('offline', 'The server could not be reached.');
  }
}
