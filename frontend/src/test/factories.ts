import type { Role } from '@roothertz/common/access';
import type { OpAmp } from '../api/opAmps';
import type { StoredResistor } from '../api/resistors';
import type { Session } from '../api/session';

export function sessionOf(role: Role, plan: Session['plan'] = 'team'): Session {
  return {
    user: { id: '7', email: `${role}@tarnfield.example`, name: 'Ada Merrow' },
    team: { id: '1', name: 'Tarnfield Instruments' },
    teams: [{ id: '1', name: 'Tarnfield Instruments' }],
    roles: [role],
    plan,
    standing: 'active',
    standingUntil: null,
  };
}

export function opAmp(changes: Partial<OpAmp> = {}): OpAmp {
  return {
    id: '41',
    library: 'team',
    manufacturer: 'Vireo',
    partNumber: 'VR-1108',
    description: '',
    package: 'SOIC-8',
    lifecycle: 'active',
    approval: 'approved',
    amplifier: {
      inputType: 'bipolar',
      channels: 1,
      voltageNoise: 1.1e-9,
      voltageNoiseCorner: 3,
      currentNoise: 1.7e-12,
      currentNoiseCorner: 50,
      gainBandwidth: 40e6,
      inputCapacitance: 2e-12,
      inputBiasCurrent: 1e-7,
      minimumStableGain: 1,
      supplyMinimum: 5,
      supplyMaximum: 36,
      supplyCurrent: 4e-3,
    },
    origins: { voltageNoise: 'measured' },
    version: 3,
    updatedAt: '2026-01-05T10:00:00.000Z',
    ...changes,
  };
}

export function resistor(changes: Partial<StoredResistor> = {}): StoredResistor {
  return {
    id: '61',
    library: 'team',
    manufacturer: 'Tarn Micro',
    partNumber: 'TR-08-4K70',
    description: '',
    package: '0805',
    lifecycle: 'active',
    approval: 'approved',
    resistor: {
      technology: 'thick-film',
      resistance: 4700,
      tolerance: 0.01,
      temperatureCoefficient: 1e-4,
      powerRating: 0.125,
      noiseIndex: -10,
      temperatureRise: 60,
    },
    origins: { noiseIndex: 'measured' },
    version: 2,
    updatedAt: '2026-01-05T10:00:00.000Z',
    ...changes,
  };
}
