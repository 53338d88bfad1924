import { createTransport, type Transporter } from 'nodemailer';
import type { AppConfig } from '../config/app-config.js';

const CONNECT_MS = 10_000;
const SILENCE_MS = 20_000;

/** Where messages are handed over; null where no mail server is named. */
export function mailTransport(config: AppConfig): Transporter | null {
  const { SMTP_HOST: host, SMTP_PORT: port, SMTP_USER: user, SMTP_PASSWORD: pass } = config;
  if (host === undefined) return null;
  return createTransport({
    host,
    port,
    secure: config.SMTP_SECURE === 'true',
    auth: user === undefined ? undefined : { user, pass },
    connectionTimeout: CONNECT_MS,
    greetingTimeout: CONNECT_MS,
    socketTimeout: SILENCE_MS,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
}

/** Whether trying again is of no use: the server refuses the message or its recipient for good. */
export function isRefusedForGood(error: unknown): boolean {
  const { code, responseCode } = error as { code?: string; responseCode?: number };
  return (code === 'EENVELOPE' || code === 'EMESSAGE') && (responseCode ?? 0) >= 500;
}
