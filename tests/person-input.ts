/** What an administrator sends to add a nurse without a sign-in. */
export const personInput = (overrides: Record<string, unknown> = {}) => ({
  name: 'N-09',
  job: 'nurse',
  statureM: 1.68,
  isMonitored: true,
  isActive: true,
  email: null,
  roles: [],
  ...overrides,
});
