import { RequestError } from './request-error';

/**
 * The calls to the server about orders, with their schemas, once one is made: a first paint needs
 * none. @throws RequestError offline
 */
export async function loadOrders(): Promise<typeof import('./orders')> {
  try {
    return await import('./orders');
  } catch {
    throw new RequestError('offline', 'The server could not be reached.');
  }
}
