export { createTeam, PASSWORD, signInMember, type TestMember, type TestTeam } from './teams.js';
export { startTestApp, type TestApp } from './test-app.js';
