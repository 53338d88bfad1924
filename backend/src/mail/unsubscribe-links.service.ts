import { createHmac, timingSafeEqual } from 'node:crypto';
import { isNotice, type MailKind, type NoticeKind } from '@roothertz/common/mail';
import { Injectable } from '@nestjs/common';
import { AppConfig } from '../config/app-config.js';
import { readId } from '../shared/ids/read-id.js';

/** Whose notices of which kind a link stops. */
export interface Refusal {
  userId: number;
  kind: NoticeKind;
}

/** Signed links by which notices are refused without signing in; they stay good as long as the server's secret. */
@Injectable()
export class UnsubscribeLinks {
  constructor(private readonly config: AppConfig) {}

  tokenFor({ userId, kind }: Refusal): string {
    const said = `${userId}.${kind}`;
    return `${said}.${this.signatureOf(said)}`;
  }

  /** What the token says, or null where this server didn't sign it. */
  read(token: string): Refusal | null {
    const [id = '', kind = '', signature = ''] = token.split('.');
    const userId = readId(id);
    if (userId === null || !isNotice(kind)) return null;
    const [expected, given] = [this.signatureOf(`${id}.${kind}`), signature].map((text) => Buffer.from(text));
    return expected.length === given.length && timingSafeEqual(expected, given) ? { userId, kind } : null;
  }

  /** The addresses for one message: the page for people, and the one that mail programs post to (RFC 8058). */
  linksFor(kind: MailKind, userId: number | null): { page: string; oneClick: string } | null {
    if (userId === null || !isNotice(kind)) return null;
    const token = this.tokenFor({ userId, kind });
    const { origin } = this.config;
    return { page: `${origin}/unsubscribe/${token}`, oneClick: `${origin}/api/mail/unsubscribe/${token}` };
  }

  private signatureOf(said: string): string {
    return createHmac('sha256', this.config.JWT_SECRET).update(`unsubscribe ${said}`).digest('base64url');
  }
}
