import { findProgram, installPackages } from './debian.mjs';
import { StepError, step } from './steps.mjs';

const ADVICE = 'Install Chromium yourself, or name one with CHROMIUM_PATH.';

const findChromium = () => process.env.CHROMIUM_PATH || findProgram('chromium', 'chromium-browser');

/** Answers the path of a Chromium for the browser journeys. */
export async function ensureChromium() {
  const { path } = await step('Chromium', async (note) => {
    const present = findChromium();
    if (present) return { path: present, outcome: 'present' };
    await installPackages(['chromium', 'fonts-liberation'], ADVICE, note);
    const path = findChromium();
    if (!path) throw new StepError(`chromium is installed, but not found. ${ADVICE}`);
    return { path, outcome: 'installed' };
  });
  return path;
}
