import 'server-only';
import { env } from '../env';

/** What a mail says, before it is set in text and HTML. */
export interface Letter {
  readonly subject: string;
  /** Paragraphs, without markup. */
  readonly lines: readonly string[];
  /** Where it leads: a path of this site. */
  readonly link: { readonly path: string; readonly label: string };
}

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (sign) => entities[sign]!);

/** Mail programs read styles on the elements alone. */
const style = {
  body: 'margin:0;padding:24px;background:#f8fafa;color:#14201f;font:16px/1.5 sans-serif',
  column: 'max-width:36em;margin:0 auto',
  head: 'margin:0 0 16px;font-size:19px;line-height:1.3',
  line: 'margin:0 0 12px',
  link: 'display:inline-block;padding:10px 16px;background:#2f45a6;color:#fff;text-decoration:none',
  foot: 'margin:24px 0 0;font-size:14px;color:#4a5655',
};

/** Subject, text and HTML of a mail. The link becomes absolute. */
export function writeLetter({ subject, lines, link }: Letter): {
  subject: string;
  text: string;
  html: string;
} {
  const url = new URL(link.path, env().NEXTAUTH_URL).href;
  // A subject is one line of a header, whatever names it repeats.
  const head = subject.replace(/\p{Cc}+/gu, ' ').slice(0, 200);
  const place = new URL(env().NEXTAUTH_URL).host;
  const paragraphs = lines.map((line) => `<p style="${style.line}">${escapeHtml(line)}</p>`);
  return {
    subject: head,
    text: `${[...lines, `${link.label}:\n${url}`, `Vaneloft, ${place}`].join('\n\n')}\n`,
    html: `<!doctype html>
<html lang="en-GB">
<head><meta charset="utf-8"><title>${escapeHtml(head)}</title></head>
<body style="${style.body}">
<div style="${style.column}">
<h1 style="${style.head}">${escapeHtml(head)}</h1>
${paragraphs.join('\n')}
<p style="${style.line}"><a href="${escapeHtml(url)}" style="${style.link}">${escapeHtml(link.label)}</a></p>
<p style="${style.foot}">Vaneloft, ${escapeHtml(place)}</p>
</div>
</body>
</html>
`,
  };
}
