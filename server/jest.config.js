const swc = (extra) => [
  '@swc/jest',
  {
    swcrc: false,
    sourceMaps: 'inline',
    module: { type: 'commonjs' },
    jsc: { target: 'es2022', keepClassNames: true, ...extra },
  },
]

// These packages ship only ES modules; jest runs CommonJS, so swc turns them over.
const esModulesOnly = [
  '@nestjs',
  'file-type',
  'strtok3',
  'token-types',
  'uint8array-extras',
  '@tokenizer',
  'load-esm',
  'nodemailer',
  'mailparser',
  'smtp-server',
  'bcryptjs',
]

export default {
  testEnvironment: 'node',
  testMatch: ['<rootDir>/src/**/*.spec.ts', '<rootDir>/test/**/*.e2e-spec.ts'],
  testTimeout: 60_000,
  // The database works beside them; on two cores the default would leave one idle.
  maxWorkers: 2,
  moduleNameMapper: { '^(\\.{1,2}/.*)\\.js$': '$1' },
  testEnvironmentOptions: {
    customExportConditions: ['@wadestone/source', 'require', 'node', 'node-addons'],
  },
  transform: {
    '^.+\\.ts$': swc({
      parser: { syntax: 'typescript', decorators: true },
      transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
    }),
    '^.+\\.m?js$': swc({ parser: { syntax: 'ecmascript' } }),
  },
  transformIgnorePatterns: [`/node_modules/(?!(?:${esModulesOnly.join('|')})/)`],
}
