export * from './account';
export * from './changeMember';
export * from './invitations';
export * from './join';
export { listMembers, type Member } from './members';
export { passwordProblem, shortestPassword, longestPassword } from './passwordRules';
export { completeReset, mayMailLink, readReset, requestReset } from './resets';
