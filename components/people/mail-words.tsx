import { Dialog } from '@/components/ui/dialog';
import type { SentMail } from '@/lib/schemas/mail';

/** Addresses in a text. */
const ADDRESS = /(https?:\/\/\S+)/;

/**
 * What a mail says. The HTML stands in a frame without scripts or forms and of no origin; a link
 * in it opens a window of its own.
 */
export function MailWords({ mail, onClose }: { mail: SentMail | null; onClose: () => void }) {
  if (!mail?.words) return null;
  const { text, html } = mail.words;
  return (
    <Dialog title={mail.subject} isOpen onClose={onClose} wide>
      <p className="text-ink-2">To {mail.to}</p>
      <iframe
        title="The mail as it looks"
        sandbox="allow-popups allow-popups-to-escape-sandbox"
        srcDoc={html.replace('<head>', '<head><base target="_blank">')}
        className="h-75 w-full border border-line bg-white"
      />
      <details>
        <summary className="cursor-pointer font-medium">As plain text</summary>
        <p className="pt-2 font-mono text-small [overflow-wrap:anywhere] whitespace-pre-wrap">
          {text.split(ADDRESS).map((part, index) =>
            index % 2 === 1 ? (
              <a key={index} href={part} target="_blank" rel="noopener">
                {part}
              </a>
            ) : (
              part
            ),
          )}
        </p>
      </details>
    </Dialog>
  );
}
