export {
  createTeam,
  PASSWORD,
  signInLibraryTeam,
  signInMember,
  type TestMember,
  type TestTeam,
} from './teams.js';
export { daysAgo, press, signed, startPaidApp } from './payments.js';
export { startTestApp, type TestApp } from './test-app.js';
