/** The bytes of a file that comes with the application, such as a font. */
export async function loadAsset(url: string): Promise<ArrayBuffer> {
  const answer = await fetch(url);
  if (!answer.ok) throw new Error(`${url} answers ${answer.status}.`);
  return answer.arrayBuffer();
}
