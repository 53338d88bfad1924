import type { Frame, Letter } from '../letter.js';

const PAPER = '#FBFAF6';
const INK = '#22252B';
const QUIET_INK = '#5C6270';
const RULE = '#DEDACF';
const DAMSON = '#6A2C5B';

const FONT = "font-family:'Source Sans 3','Segoe UI',Helvetica,Arial,sans-serif";
const TEXT = `${FONT};font-size:16px;line-height:24px;color:${INK};margin:0 0 16px`;
const SMALL = `${FONT};font-size:13px;line-height:20px;color:${QUIET_INK};margin:0 0 8px`;
const BUTTON = `${FONT};font-size:16px;line-height:24px;color:#FFFFFF;background:${DAMSON};border-radius:4px;padding:8px 16px;text-decoration:none;display:inline-block`;

/** A letter as a page of HTML whose styles stand in line, as mail programs need them. */
export function htmlLetter(letter: Letter, frame: Frame): string {
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escaped(letter.subject)}</title></head>
<body style="margin:0;padding:24px 16px;background:${PAPER}">
<div style="max-width:560px;margin:0 auto">
<p style="${FONT};font-size:18px;font-weight:600;color:${DAMSON};margin:0 0 16px;padding:0 0 8px;border-bottom:1px solid ${RULE}">Roothertz</p>
${bodyOf(letter, frame).join('\n')}
</div>
</body>
</html>
`;
}

function bodyOf({ paragraphs, items, link, remark }: Letter, { origin, unsubscribeUrl }: Frame): string[] {
  return [
    ...paragraphs.map((paragraph) => `<p style="${TEXT}">${escaped(paragraph)}</p>`),
    ...(items?.length ? [listOf(items)] : []),
    ...(link ? [linkTo(link.label, origin + link.path)] : []),
    `<div style="border-top:1px solid ${RULE};padding:12px 0 0">`,
    ...(remark ? [`<p style="${SMALL}">${escaped(remark)}</p>`] : []),
    ...(unsubscribeUrl ? [refusal(unsubscribeUrl)] : []),
    '</div>',
  ];
}

function listOf(items: readonly string[]): string {
  const lines = items.map((item) => `<li style="${TEXT};margin:0 0 4px">${escaped(item)}</li>`);
  return `<ul style="margin:0 0 16px;padding:0 0 0 20px">${lines.join('')}</ul>`;
}

/** The address stands below the button too, for who can't click it. */
function linkTo(label: string, url: string): string {
  const href = escaped(url);
  return `<p style="${TEXT}"><a href="${href}" style="${BUTTON}">${escaped(label)}</a></p>
<p style="${SMALL};overflow-wrap:anywhere">${href}</p>`;
}

function refusal(url: string): string {
  return `<p style="${SMALL}"><a href="${escaped(url)}" style="color:${QUIET_INK}">Stop these e-mails</a></p>`;
}

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}
