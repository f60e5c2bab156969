import type { ParsedMail } from 'mailparser';
import type { LetterHead } from './letter-store';

/** Pages of the post box. They hold no script, and everything of a letter is escaped. */

export function listPage(letters: LetterHead[], to: string): string {
  const rows = letters.map(
    ({ id, receivedAt, to: receiver, subject }) =>
      `<li><a href="/letters/${id}"><time datetime="${receivedAt}">${moment(receivedAt)}</time>` +
      `<span>${escaped(receiver)}</span><strong>${escaped(subject)}</strong></a></li>`,
  );
  const empty = to ? `No letter to ${escaped(to)} has come.` : 'No letter has come yet. Reload the page to look again.';
  return page(
    'Post box',
    `<header><h1>Post box</h1><p class="soft">Every letter of this Bellgap, on this computer only. Nothing leaves it.</p></header>
<form method="get" action="/" role="search"><label for="to">Letters to</label>
<input id="to" name="to" value="${escaped(to)}" autocomplete="off" spellcheck="false">
<button>Show</button>${to ? ' <a href="/">all letters</a>' : ''}</form>
<div class="sheet">${rows.length > 0 ? `<ol>${rows.join('\n')}</ol>` : `<p class="soft">${empty}</p>`}</div>`,
  );
}

export function letterPage({ id, receivedAt, to, subject }: LetterHead, letter: ParsedMail): string {
  const facts: [string, string][] = [
    ['To', to],
    ['From', letter.from?.text ?? ''],
    ['Received', moment(receivedAt)],
    ['Message-ID', letter.messageId ?? ''],
  ];
  const html = letter.html
    ? `<section class="sheet"><h2>With its look</h2>
<iframe title="The letter with its look" src="/letters/${id}/html" sandbox="allow-popups allow-popups-to-escape-sandbox"></iframe></section>`
    : '';
  return page(
    subject,
    `<header><h1>${escaped(subject)}</h1><p><a href="/">All letters</a></p></header>
<section class="sheet"><dl>${facts.map(([term, value]) => `<dt>${term}</dt><dd>${escaped(value)}</dd>`).join('')}</dl></section>
<section class="sheet"><h2>As text</h2><pre>${withLinks(letter.text ?? '')}</pre></section>
${html}`,
  );
}

export const notFoundPage = () =>
  page('Not found', '<header><h1>There is no such letter</h1><p><a href="/">All letters</a></p></header>');

/** Links of a letter leave its frame. */
export const framed = (html: string) => html.replace(/<head[^>]*>/i, (head) => `${head}<base target="_blank">`);

function page(title: string, body: string): string {
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escaped(title)} · Bellgap post box</title><link rel="stylesheet" href="/look.css"><link rel="icon" href="data:,"></head>
<body><main>${body}</main></body>
</html>
`;
}

function withLinks(text: string): string {
  return text
    .trimEnd()
    .split(/(https?:\/\/[^\s<>"]+)/)
    .map((part, at) =>
      at % 2 === 1
        ? `<a href="${escaped(part)}" target="_blank" rel="noopener noreferrer">${escaped(part)}</a>`
        : escaped(part),
    )
    .join('');
}

const moment = (instant: string) => `${instant.slice(0, 10)} ${instant.slice(11, 19)}Z`;

const SIGNS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escaped = (text: string) => text.replace(/[&<>"']/g, (sign) => SIGNS[sign] ?? sign);
