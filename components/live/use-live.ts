import type { QueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { keysTouched, type Change } from './keys-touched';

/** How often everything on the screen is asked for again while nothing can be heard, ms. */
const POLL = 5_000;

/**
 * Keeps what is on the screen as it is in the workshop: hears of changes by server-sent events, or
 * asks again every few seconds while that does not work. A hidden tab holds no connection, since a
 * browser has few for one site; it looks at everything again when it is shown.
 * @param since the last change that the page was made with
 */
export function useLive(client: QueryClient, since: string): void {
  useEffect(() => {
    let source: EventSource | null = null;
    let poll: ReturnType<typeof setInterval> | undefined;

    const lookAgain = (): void => void client.invalidateQueries();
    const stopPolling = (): void => {
      clearInterval(poll);
      poll = undefined;
    };

    function open(): void {
      source = new EventSource(`/api/live?since=${since}`);
      let before = false;
      source.onopen = () => {
        // After a pause some may have been missed.
        if (before || poll !== undefined) lookAgain();
        before = true;
        stopPolling();
      };
      source.onerror = () => {
        poll ??= setInterval(() => {
          lookAgain();
          // A refused stream is not opened again by the browser.
          if (source?.readyState === EventSource.CLOSED) {
            source.close();
            open();
          }
        }, POLL);
      };
      source.addEventListener('change', ({ data }: MessageEvent<string>) => {
        for (const touched of keysTouched(JSON.parse(data) as Change)) {
          void client.invalidateQueries(touched);
        }
      });
      source.addEventListener('again', lookAgain);
    }

    function close(): void {
      stopPolling();
      source?.close();
      source = null;
    }

    function onVisibility(): void {
      if (document.visibilityState === 'hidden') close();
      else if (!source) {
        lookAgain();
        open();
      }
    }

    if (document.visibilityState !== 'hidden') open();
    document.addEventListener('visibilitychange', onVisibility);
    return () => {
      document.removeEventListener('visibilitychange', onVisibility);
      close();
    };
  }, [client, since]);
}
