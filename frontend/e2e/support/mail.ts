import { expect } from 'vitest';

const MAIL_URL = process.env.E2E_MAIL_URL ?? 'http://127.0.0.1:33081';

interface CaughtMail {
  to: { address: string }[];
  subject: string;
  text: string;
}

/** The latest e-mail that was sent to an address, waited for. */
export async function mailTo(address: string): Promise<CaughtMail> {
  const caught = async () => {
    const answer = await fetch(`${MAIL_URL}/api/email`);
    const mails = (await answer.json()) as CaughtMail[];
    return mails.filter(({ to }) => to.some((one) => one.address === address));
  };
  await expect.poll(async () => (await caught()).length, { timeout: 30_000 }).toBeGreaterThan(0);
  return (await caught()).at(-1)!;
}

/** The path of the application's own that an e-mail leads to. */
export function pathIn({ text }: CaughtMail): string {
  return new URL(/https?:\/\/\S+/.exec(text)![0]).pathname;
}
