const ESM_PACKAGES = [
  '@nestjs',
  '@roothertz',
  'csv-parse',
  'file-type',
  'nodemailer',
  'strtok3',
  'token-types',
  'uint8array-extras',
  '@tokenizer',
  '@borewit',
];

const swc = {
  jsc: {
    target: 'es2022',
    parser: { syntax: 'typescript', decorators: true },
    transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
    keepClassNames: true,
  },
  module: { type: 'commonjs' },
  sourceMaps: 'inline',
};

export default {
  testEnvironment: 'node',
  testMatch: ['<rootDir>/{src,fakes}/**/*.spec.ts', '<rootDir>/test/**/*.e2e-spec.ts'],
  transform: { '^.+\\.(t|j)s$': ['@swc/jest', swc] },
  transformIgnorePatterns: [`/node_modules/(?!(${ESM_PACKAGES.join('|')})/)`],
  moduleNameMapper: { '^(\\.{1,2}/.*)\\.js$': '$1' },
  maxWorkers: 2,
  testTimeout: 60_000,
};
