import base from './jest.config.mjs';

/** The long drills, one after another: each wants the machine for itself. */
export default { ...base, testMatch: ['<rootDir>/drills/**/*.drill.ts'], testTimeout: 1_200_000, maxWorkers: 1 };
