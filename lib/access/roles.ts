/** One role a member. The owner may do everything. */
export const roles = ['owner', 'planner', 'reviewer', 'crew'] as const;
export type Role = (typeof roles)[number];
