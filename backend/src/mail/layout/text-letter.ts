import type { Frame, Letter } from '../letter.js';

/** A letter as plain text. */
export function textLetter(
  { paragraphs, items, link, remark }: Letter,
  { origin, unsubscribeUrl }: Frame,
): string {
  const foot = [remark, unsubscribeUrl && `Stop these e-mails: ${unsubscribeUrl}`].filter(Boolean);
  const blocks = [
    ...paragraphs,
    ...(items?.length ? [items.map((item) => `- ${item}`).join('\n')] : []),
    ...(link ? [`${link.label}:\n${origin}${link.path}`] : []),
    ['-- ', 'Roothertz', ...foot].join('\n'),
  ];
  return `${blocks.join('\n\n')}\n`;
}
