import type { Frame, Letter, LetterList } from '../letter.js';

const PAPER = '#FBFAF6';
const INK = '#22252B';
const QUIET_INK = '#5C6270';
const RULE = '#DEDACF';
const DAMSON = '#6A2C5B';

const FONT = "font-family:'Source Sans 3','Segoe UI',Helvetica,Arial,sans-serif";
const TEXT = `${FONT};font-size:16px;line-height:24px;color:${INK};margin:0 0 16px`;
const SMALL = `${FONT};font-size:13px;line-height:20px;color:${QUIET_INK};margin:0 0 8px`;
const BUTTON = `${FONT};font-size:16px;line-height:24px;color:#FFFFFF;background:${DAMSON};border-radius:4px;padding:8px 16px;text-decoration:none;display:inline-block`;

/** For readers who have it dark: what stands in line is overruled where a program knows how. */
const DARK = `@media (prefers-color-scheme: dark) {
.paper { background: #17181B !important }
.ink { color: #E9E7E1 !important }
.quiet { color: #A9AEB8 !important }
.name { color: #C58AB5 !important }
.rule { border-color: #34373D !important }
.button { color: #17181B !important; background: #C58AB5 !important }
}`;

/** A letter as a page of HTML whose styles stand in line, as mail programs need them. */
export function htmlLetter(letter: Letter, frame: Frame): string {
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><meta name="color-scheme" content="light dark"><title>${escaped(letter.subject)}</title><style>${DARK}</style></head>
<body class="paper" style="margin:0;padding:24px 16px;background:${PAPER}">
<div style="max-width:560px;margin:0 auto">
<p class="name rule" style="${FONT};font-size:18px;font-weight:600;color:${DAMSON};margin:0 0 16px;padding:0 0 8px;border-bottom:1px solid ${RULE}">Roothertz</p>
${bodyOf(letter, frame).join('\n')}
</div>
</body>
</html>
`;
}

function bodyOf(
  { paragraphs, lists = [], link, remark }: Letter,
  { origin, unsubscribeUrl }: Frame,
): string[] {
  return [
    ...paragraphs.map((paragraph) => `<p class="ink" style="${TEXT}">${escaped(paragraph)}</p>`),
    ...lists.map(listOf),
    ...(link ? [linkTo(link.label, origin + link.path)] : []),
    `<div class="rule" style="border-top:1px solid ${RULE};padding:12px 0 0">`,
    ...(remark ? [`<p class="quiet" style="${SMALL}">${escaped(remark)}</p>`] : []),
    ...(unsubscribeUrl ? [refusal(unsubscribeUrl)] : []),
    '</div>',
  ];
}

function listOf({ heading, items }: LetterList): string {
  const title = heading
    ? `<p class="ink" style="${TEXT};font-weight:600;margin:0 0 4px">${escaped(heading)}</p>\n`
    : '';
  const lines = items.map((item) => `<li class="ink" style="${TEXT};margin:0 0 4px">${escaped(item)}</li>`);
  return `${title}<ul style="margin:0 0 16px;padding:0 0 0 20px">${lines.join('\n')}</ul>`;
}

/** The address stands below the button too, for who can't click it. */
function linkTo(label: string, url: string): string {
  const href = escaped(url);
  return `<p style="${TEXT}"><a class="button" href="${href}" style="${BUTTON}">${escaped(label)}</a></p>
<p class="quiet" style="${SMALL};overflow-wrap:anywhere">${href}</p>`;
}

function refusal(url: string): string {
  return `<p style="${SMALL}"><a class="quiet" href="${escaped(url)}" style="color:${QUIET_INK}">Stop these e-mails</a></p>`;
}

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}
