import 'server-only';
import { isStillMember, type Viewer } from '../access';
import { log } from '../log';
import { changes } from './changes';
import { latestChange } from './latest-change';

const AGAIN = 'event: again\ndata: {}\n\n';

/** Keeps proxies from closing a quiet stream, and asks whether the person still belongs here. */
const BEAT = 15_000;

/**
 * Server-sent events for one screen: `change` with what was recorded, `again` when some may have
 * been missed. Ends with the request, and with the membership or session that opened it.
 * @param since the last change that the screen's page knew of, if it says so
 */
export function changeStream(
  viewer: Viewer,
  epoch: number,
  since: string | null,
  signal: AbortSignal,
): ReadableStream {
  const encoder = new TextEncoder();
  let stop = (): void => undefined;
  return new ReadableStream<Uint8Array>({
    start(controller) {
      let ended = false;
      const write = (text: string): void => {
        if (!ended) controller.enqueue(encoder.encode(text));
      };
      const letGo = (): void => {
        ended = true;
        clearInterval(beat);
        leave();
        signal.removeEventListener('abort', end);
      };
      const end = (): void => {
        if (ended) return;
        letGo();
        controller.close();
      };
      const askAgain = async (): Promise<void> => {
        if (!(await isStillMember(viewer, epoch))) end();
      };
      const check = (): void => {
        // While the database is away nothing is told either.
        askAgain().catch((error: unknown) => log.debug({ err: error }, 'membership not asked'));
      };
      const leave = changes().follow({
        workshop: viewer.workshopId,
        tell: ({ what, subject, revision }) => {
          write(`event: change\ndata: ${JSON.stringify({ what, subject, revision })}\n\n`);
          if (what.startsWith('member-')) check();
        },
        lookAgain: () => write(AGAIN),
        end,
      });
      const beat = setInterval(() => {
        write(': still here\n\n');
        check();
      }, BEAT);
      beat.unref();
      signal.addEventListener('abort', end);
      stop = letGo;
      write('retry: 1000\n\n');
      // What was recorded while the page was on its way to the screen.
      if (since !== null) {
        latestChange(viewer).then(
          (latest) => latest !== since && write(AGAIN),
          () => write(AGAIN),
        );
      }
      if (signal.aborted) end();
    },
    cancel: () => stop(),
  });
}
