import { randomBytes } from 'node:crypto';
import { inLocal } from './paths.mjs';
import { readJson, writePrivately } from './records.mjs';

const secret = () => randomBytes(32).toString('base64url');

/** The machine's own secrets, made once: losing the file only signs everybody out. */
export function readCredentials() {
  const path = inLocal('credentials.json');
  const kept = readJson(path);
  const fresh = { databasePassword: secret(), applicationPassword: secret(), jwtSecret: secret() };
  const credentials = { ...fresh, ...kept };
  if (Object.keys(fresh).some((name) => !kept?.[name])) writePrivately(path, credentials);
  return credentials;
}
