import type { Letter } from '../letter.js';
import { htmlLetter } from './html-letter.js';
import { textLetter } from './text-letter.js';

const letter: Letter = {
  subject: 'Prices of <Weir & Sons>',
  paragraphs: ['Two prices of <b>Weir & Sons</b> are stale.'],
  lists: [{ heading: 'Ending soon', items: ['OX-27 "quiet"'] }],
  link: { label: 'Open the prices', path: '/prices?state=stale&page=2' },
  remark: 'Sent each Monday.',
};
const frame = { origin: 'https://noise.example', unsubscribeUrl: 'https://noise.example/unsubscribe/a.b' };

describe('layout of a letter', () => {
  it('says the same in HTML and in plain text', () => {
    const [html, text] = [htmlLetter(letter, frame), textLetter(letter, frame)];
    for (const said of [
      'are stale.',
      'Ending soon',
      'OX-27',
      'Open the prices',
      'Sent each Monday.',
      frame.unsubscribeUrl,
    ]) {
      expect(html).toContain(said);
      expect(text).toContain(said);
    }
    expect(text).toContain('https://noise.example/prices?state=stale&page=2');
  });

  it('shows what looks like HTML as it was written', () => {
    const html = htmlLetter(letter, frame);
    expect(html).not.toMatch(/<b>|Weir & /);
    expect(html).toContain('&#60;b&#62;Weir &#38; Sons&#60;/b&#62;');
    expect(html).toContain('href="https://noise.example/prices?state=stale&#38;page=2"');
  });

  it('offers to stop only what can be stopped', () => {
    expect(textLetter(letter, { ...frame, unsubscribeUrl: null })).not.toContain('Stop these');
    expect(htmlLetter(letter, { ...frame, unsubscribeUrl: null })).not.toContain('Stop these');
  });
});
