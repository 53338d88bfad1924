import { randomBytes } from 'node:crypto';
import { inLocal } from './paths.mjs';
import { readJson, writePrivately } from './records.mjs';

const secret = () => randomBytes(32).toString('base64url');

/** The machine's own secrets, made once: losing the file only signs everybody out. */
export function readCredentials() {
  const path = inLocal('credentials.json');
  const kept = readJson(path);
  const credentials = { databasePassword: secret(), jwtSecret: secret(), ...kept };
  if (!kept?.databasePassword || !kept?.jwtSecret) writePrivately(path, credentials);
  return credentials;
}
