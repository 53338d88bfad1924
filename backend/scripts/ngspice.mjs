import { findProgram, installPackages } from './debian.mjs';
import { StepError, step } from './steps.mjs';

const ADVICE = 'Install ngspice yourself, or name one with NGSPICE_PATH.';

const findNgspice = () => process.env.NGSPICE_PATH || findProgram('ngspice');

/** Answers the path of the circuit simulator against which the noise model is checked. */
export async function ensureNgspice() {
  const { path } = await step('ngspice', async (note) => {
    const present = findNgspice();
    if (present) return { path: present, outcome: 'present' };
    await installPackages(['ngspice'], ADVICE, note);
    const path = findNgspice();
    if (!path) throw new StepError(`ngspice is installed, but not found. ${ADVICE}`);
    return { path, outcome: 'installed' };
  });
  return path;
}
