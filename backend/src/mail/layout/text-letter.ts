import type { Frame, Letter, LetterList } from '../letter.js';

/** A letter as plain text. */
export function textLetter(
  { paragraphs, lists = [], link, remark }: Letter,
  { origin, unsubscribeUrl }: Frame,
): string {
  const foot = [remark, unsubscribeUrl && `Stop these e-mails: ${unsubscribeUrl}`].filter(Boolean);
  const blocks = [
    ...paragraphs,
    ...lists.map(listText),
    ...(link ? [`${link.label}:\n${origin}${link.path}`] : []),
    ['-- ', 'Roothertz', ...foot].join('\n'),
  ];
  return `${blocks.join('\n\n')}\n`;
}

function listText({ heading, items }: LetterList): string {
  return [...(heading ? [`${heading}:`] : []), ...items.map((item) => `- ${item}`)].join('\n');
}
