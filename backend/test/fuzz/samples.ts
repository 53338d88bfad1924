const conditions = {
  source: { resistance: 600, inductance: 0.1, capacitance: 1e-10, temperature: 298.15 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20_000, lowPassOrder: 2 },
  stage: { topology: 'non-inverting', gain: 100, gainResistance: 10, network: { minimumTotal: 500 } },
  referenceFrequency: 1_000,
  bandwidthMargin: 3,
  amplifierTemperatureModel: 'estimated',
};

const currentSource = {
  ...conditions,
  source: { resistance: 5e8, inductance: 0, capacitance: 5e-11, directCurrent: 1e-9 },
  stage: { topology: 'transimpedance', feedbackResistance: 1e6, feedbackCapacitance: 'auto' },
};

const difference = { ...conditions, stage: { topology: 'difference', gain: 10, gainResistance: 1000 } };

const instrumentation = {
  ...conditions,
  stage: {
    topology: 'instrumentation',
    gain: 20,
    gainResistance: 1000,
    loadResistance: 1e6,
    differenceResistance: 5000,
  },
};

const amplifier = { inputType: 'jfet', voltageNoise: 3e-9, currentNoise: 1e-15, gainBandwidth: 1e7 };
const opAmp = { manufacturer: 'Alderney Analogue', partNumber: 'AA101', package: 'SOIC-8', amplifier };

const resistor = {
  manufacturer: 'Alderney Analogue',
  partNumber: 'AR101',
  resistor: {
    technology: 'thin-film',
    resistance: 1000,
    powerRating: 0.1,
    noiseIndex: -30,
    temperatureRise: 50,
  },
};
const place = {
  conditions: { resistance: 1000, resistanceTolerance: 0.5, dcVoltage: 5, band: { lower: 0.1, upper: 1000 } },
  filter: { search: 'a', library: ['team'], technology: ['thin-film'], package: '' },
  quantity: 10,
};

const filter = {
  search: 'a',
  library: ['curated', 'team'],
  lifecycle: ['active'],
  supply: { minimum: 5, maximum: 12 },
};
const request = { conditions, filter, target: { inputNoiseRms: 5e-7 }, quantity: 100 };
const page = { sort: '-inputNoiseRms', limit: 10, offset: 0 };

const offered = {
  partId: '1',
  supplierId: '1',
  currency: 'EUR',
  breaks: [
    { minimumQuantity: 1, unitPrice: '4.20' },
    { minimumQuantity: 100, unitPrice: '3.1' },
  ],
  minimumOrderQuantity: 10,
  orderMultiple: 5,
  leadTimeDays: 42,
  stock: null,
  validFrom: '2026-01-01',
  validUntil: '2199-12-31',
};

/** A body that each operation takes, from which the hostile ones are made. */
export const SAMPLES: Record<string, unknown[]> = {
  'post /api/auth/sign-in': [{ email: 'person@weir.example', password: 'a guess' }],
  'post /api/auth/sign-out': [{}],
  'post /api/auth/sign-up': [
    {
      name: 'Ada Weir',
      email: 'ada@weir.example',
      password: 'correct pony battery',
      teamName: 'Weir & Daughter',
    },
  ],
  'post /api/auth/password-resets': [{ email: 'nobody@weir.example' }],
  'post /api/auth/confirm': [{ token: 'a-guess' }],
  'post /api/auth/reset-password': [{ token: 'a-guess', password: 'correct pony battery' }],
  'post /api/auth/team': [{ teamId: '1' }],
  'patch /api/account': [{ name: 'Ada Weir' }],
  'post /api/account/password': [{ currentPassword: 'a guess', newPassword: 'correct pony battery' }],
  'post /api/account/email': [{ email: 'ada@weir.example', password: 'a guess' }],
  'post /api/account/close': [{ password: 'a guess' }],
  'post /api/conditions': [{ name: 'River geophone', ...request, partIds: ['1'] }],
  'patch /api/conditions/{id}': [{ version: 1, name: 'Turbidity', ...request, partIds: [] }],
  'put /api/imports/{id}/mapping': [
    {
      decimalMark: 'point',
      columns: [
        { column: 0, field: 'manufacturer' },
        { column: 1, field: 'partNumber', form: 'value', unit: null },
        {
          column: 2,
          field: 'voltageNoise',
          form: 'spot',
          unit: 'nV/√Hz',
          frequency: 1000,
          quantity: null,
          origin: 'maximum',
        },
      ],
    },
    { encoding: 'utf-8', delimiter: 'comma', headerLine: 1, wholeList: {} },
  ],
  'post /api/imports/{id}/apply': [{}],
  'post /api/imports/{id}/cancel': [{}],
  'post /api/imports/{id}/undo': [{}],
  'post /api/op-amps': [opAmp],
  'patch /api/op-amps/{id}': [{ version: 1, partNumber: 'AA102', amplifier: { voltageNoise: 2e-9 } }],
  'post /api/duplicates/keep-both': [{ oneId: '1', otherId: '2' }],
  'post /api/duplicates/ask-again': [{ oneId: '1', otherId: '2' }],
  'patch /api/op-amps': [{ parts: [{ id: '1', version: 1, lifecycle: 'obsolete', approval: 'restricted' }] }],
  'patch /api/resistors': [{ parts: [{ id: '2', version: 1, approval: 'not-approved' }] }],
  'post /api/op-amps/standings': [
    { libraryRevision: 4_000_000_000, lifecycle: 'obsolete', approval: 'restricted' },
  ],
  'post /api/op-amps/standings/{id}/undo': [{}],
  'post /api/resistors/standings': [{ libraryRevision: 4_000_000_000, approval: 'not-approved' }],
  'post /api/resistors/standings/{id}/undo': [{}],
  'post /api/resistors': [resistor],
  'patch /api/resistors/{id}': [{ version: 1, partNumber: 'AR102', resistor: { noiseIndex: -20 } }],
  'post /api/rankings/resistors': [{ ...place, sort: '-totalRms', limit: 10 }],
  'post /api/rankings/resistors/exclusions': [{ ...place, limit: 10 }],
  'post /api/rankings/op-amps': [
    { ...request, ...page },
    { conditions: currentSource },
    { conditions: difference },
    { conditions: instrumentation },
  ],
  'post /api/rankings/op-amps/exclusions': [{ ...request, limit: 10 }],
  'post /api/rankings/stages': [
    {
      conditions: {
        ...conditions,
        stage: { topology: 'inverting', gain: 10, gainTolerance: 0.01, outputVoltage: 5 },
      },
      filter,
      resistorFilter: { technology: ['thin-film'] },
      quantity: 10,
      sort: 'unitPrice',
      within: 0.5,
      limit: 5,
    },
  ],
  'post /api/rankings/quietest-map': [
    {
      conditions,
      filter,
      resistance: { from: 1, to: 1e6, steps: 4 },
      frequency: { from: 1, to: 1e5, steps: 3 },
    },
  ],
  'patch /api/team': [{ name: 'Weir & Sons' }],
  'patch /api/team/members/{id}': [{ roles: ['admin', 'librarian', 'engineer'] }],
  'post /api/team/invitations': [{ email: 'new.person@weir.example', roles: ['engineer', 'reviewer'] }],
  'post /api/team/invitations/{id}/resend': [{}],
  'post /api/invitations/{token}/accept': [{}],
  'post /api/invitations/{token}/account': [{ name: 'Nell Weir', password: 'still water runs deep' }],
  'post /api/team/owner': [{ memberId: '1' }],
  'post /api/billing/trial': [{}],
  'post /api/billing/checkout': [{ seats: 3 }],
  'post /api/billing/portal': [{}],
  'post /api/billing/sync': [{}],
  'post /api/billing/seats/preview': [{ seats: 4 }],
  'put /api/billing/seats': [{ seats: 4, prorationDate: 1_767_225_600 }],
  'post /api/billing/webhook': [{ id: 'evt_1', type: 'invoice.paid' }],
  'post /api/suppliers': [{ name: 'Brook & Weir' }],
  'post /api/mail/unsubscribe/{token}': [{}],
  'put /api/mail/preferences': [{ kind: 'price-digest', wanted: false }],
  'put /api/prices': [{ rows: [{ ...offered, supplierNumber: 'BW-1' }] }],
  'put /api/prices/rates': [{ dated: '2026-03-01', rates: [{ currency: 'USD', rate: '0.9' }] }],
  'put /api/prices/settings': [{ currency: 'EUR', staleAfterDays: 60 }],
  'post /api/offers': [{ ...offered, supplierNumber: 'BW-2' }],
  'post /api/offers/confirm': [{ ids: ['1'] }],
  'post /api/offers/confirm/undo': [{ ids: ['1'] }],
  'patch /api/offers/{id}': [{ version: 1, currency: 'USD', breaks: offered.breaks, stock: 5 }],
  'post /api/noise/stage': [
    { conditions, amplifier },
    { conditions: currentSource, amplifier },
    { conditions: difference, amplifier },
    { conditions: instrumentation, amplifier },
  ],
};
