import type { CookieOptions, Request, Response } from 'express';
import type { AppConfig } from '../config/app-config.js';

export const SESSION_COOKIE = 'roothertz_session';
export const SESSION_HOURS = 12;

export function readSessionCookie(request: Request): string | null {
  const cookies = request.cookies as Record<string, string> | undefined;
  return cookies?.[SESSION_COOKIE] ?? null;
}

export function setSessionCookie(response: Response, token: string, config: AppConfig): void {
  response.cookie(SESSION_COOKIE, token, { ...cookieOptions(config), maxAge: SESSION_HOURS * 3_600_000 });
}

export function clearSessionCookie(response: Response, config: AppConfig): void {
  response.clearCookie(SESSION_COOKIE, cookieOptions(config));
}

function cookieOptions({ PUBLIC_ORIGIN }: AppConfig): CookieOptions {
  return { httpOnly: true, sameSite: 'lax', path: '/', secure: PUBLIC_ORIGIN?.startsWith('https:') };
}
