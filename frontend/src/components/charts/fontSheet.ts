import greek from '@fontsource/source-sans-3/files/source-sans-3-greek-400-normal.woff2?url';
import boldGreek from '@fontsource/source-sans-3/files/source-sans-3-greek-600-normal.woff2?url';
import latin from '@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff2?url';
import boldLatin from '@fontsource/source-sans-3/files/source-sans-3-latin-600-normal.woff2?url';
import { loadAsset } from '../../api/asset';

interface Face {
  url: string;
  weight: number;
  range?: string;
}

const GREEK = 'U+0370-03FF';
const FACES: readonly Face[] = [
  { url: latin, weight: 400 },
  { url: boldLatin, weight: 600 },
  { url: greek, weight: 400, range: GREEK },
  { url: boldGreek, weight: 600, range: GREEK },
];

/**
 * The page's font as a style sheet that needs nothing else, so that a saved drawing looks as on the page where
 * the font isn't installed. Empty where the font can't be had: a drawing in another font is better than none.
 */
export async function fontSheet(): Promise<string> {
  try {
    return (await Promise.all(FACES.map(rule))).join('');
  } catch {
    return '';
  }
}

async function rule({ url, weight, range }: Face): Promise<string> {
  const source = `url(data:font/woff2;base64,${base64(await loadAsset(url))}) format('woff2')`;
  const characters = range === undefined ? '' : `unicode-range:${range};`;
  return `@font-face{font-family:'Source Sans 3';font-weight:${weight};font-display:swap;${characters}src:${source}}`;
}

function base64(bytes: ArrayBuffer): string {
  return btoa(Array.from(new Uint8Array(bytes), (byte) => String.fromCharCode(byte)).join(''));
}
