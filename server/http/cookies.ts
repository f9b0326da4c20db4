import type { CookieOptions, Request, Response } from 'express';
import type { Config } from '../config/config.ts';

type CookieName = 'access' | 'refresh';

const named = (name: CookieName, config: Config): string =>
  `${config.cookieSecure ? '__Host-' : ''}backmark_${name}`;

const options = (config: Config): CookieOptions => ({
  httpOnly: true,
  secure: config.cookieSecure,
  sameSite: 'lax',
  path: '/',
});

/** Scripts of the page cannot read these, and other sites' requests do not carry them. */
export function setCookie(
  res: Response,
  config: Config,
  name: CookieName,
  value: string,
  expires: Date,
): void {
  res.cookie(named(name, config), value, { ...options(config), expires });
}

export function readCookie(req: Request, config: Config, name: CookieName): string | undefined {
  const value: unknown = (req.cookies as Record<string, unknown> | undefined)?.[named(name, config)];
  return typeof value === 'string' && value.length <= 4096 ? value : undefined;
}

/** Takes both away. */
export function clearCookies(res: Response, config: Config): void {
  for (const name of ['access', 'refresh'] as const) res.clearCookie(named(name, config), options(config));
}
