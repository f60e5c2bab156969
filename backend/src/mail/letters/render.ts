import type { LetterContent } from './content';

export interface RenderedLetter {
  subject: string;
  text: string;
  html: string;
}

interface Envelope {
  name: string;
  /** Address of the product, the sender of the letter. */
  origin: string;
}

export function renderLetter(content: LetterContent, envelope: Envelope): RenderedLetter {
  return {
    subject: oneLine(content.subject),
    text: asText(content, envelope),
    html: asHtml(content, envelope),
  };
}

function asText({ paragraphs, facts, action, closing }: LetterContent, { name, origin }: Envelope): string {
  const width = Math.max(...facts.map(([label]) => label.length), 0);
  const parts = [
    `Hello ${oneLine(name)},`,
    ...paragraphs,
    facts.map(([label, value]) => `  ${label.padEnd(width)}  ${indented(value, width + 4)}`).join('\n'),
    action ? `${action.label}:\n${action.url}` : '',
    ...closing,
    `Bellgap, ${origin}`,
  ];
  return `${parts.filter((part) => part !== '').join('\n\n')}\n`;
}

const indented = (value: string, columns: number) =>
  value
    .trim()
    .split(/\r?\n/)
    .join(`\n${' '.repeat(columns)}`);

const INK = '#1d2528';
const SOFT = '#5a6468';
const RULE = '#cfc8ba';
const GROUND = '#f6f3ec';
const GLASS = '#1e6e66';

/** Plain enough for any reader of mail: one column, styles at their elements, nothing fetched from anywhere. */
function asHtml(content: LetterContent, { name, origin }: Envelope): string {
  const { subject, paragraphs, facts, action, closing } = content;
  const paragraph = (text: string) => `<p style="margin:0 0 16px">${escaped(text)}</p>`;
  const body = [
    paragraph(`Hello ${name},`),
    ...paragraphs.map(paragraph),
    facts.length > 0
      ? `<table style="border-collapse:collapse;margin:0 0 16px">${facts.map(row).join('')}</table>`
      : '',
    action
      ? `<p style="margin:0 0 16px"><a href="${escaped(action.url)}" style="display:inline-block;background:${GLASS};` +
        `color:#ffffff;padding:9px 16px;text-decoration:none">${escaped(action.label)}</a></p>` +
        `<p style="margin:0 0 16px;font-size:12px;color:${SOFT};word-break:break-all">${escaped(action.url)}</p>`
      : '',
    ...closing.map(paragraph),
    `<p style="margin:24px 0 0;padding-top:12px;border-top:1px solid ${RULE};color:${SOFT};font-size:12px">` +
      `Bellgap, ${escaped(origin)}</p>`,
  ].join('\n');
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escaped(subject)}</title></head>
<body style="margin:0;padding:24px;background:${GROUND};color:${INK};font:15px/1.5 'IBM Plex Sans',Arial,sans-serif">
<div style="max-width:600px;margin:0 auto;padding:24px;background:#ffffff;border:1px solid ${RULE}">
${body}
</div>
</body>
</html>
`;
}

const row = ([label, value]: [string, string]) =>
  `<tr><th style="text-align:left;vertical-align:top;font-weight:normal;color:${SOFT};padding:2px 16px 2px 0">` +
  `${escaped(label)}</th><td style="padding:2px 0;white-space:pre-line;word-break:break-word">${escaped(value)}</td></tr>`;

const oneLine = (text: string) => text.replace(/\s+/g, ' ').trim();

const SIGNS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text: string) => text.replace(/[&<>"']/g, (sign) => SIGNS[sign] ?? sign);
