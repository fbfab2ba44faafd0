import { RequestError } from './request-error';

type DesignsApi = typeof import('./designs');

let loaded: DesignsApi | null = null;

/**
 * The calls to the server with their schemas. A first paint needs neither, so they come with the
 * first call; whoever starts to edit gets them at once, lest the connection be gone by then.
 * @throws RequestError offline
 */
export async function loadApi(): Promise<DesignsApi> {
  try {
    loaded ??= await import('./designs');
    return loaded;
  } catch {
    throw new RequestError('offline', 'The server could not be reached.');
  }
}
