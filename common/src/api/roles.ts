/** Roles of people; a person may hold several, each limited to a project, a check category and dates. */
export const ROLES = ['engineer', 'checker', 'approver', 'procurement', 'reader', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

/** Roles that may see drafts; the others see issued sheets only, and drafts do not exist for them. */
export const DRAFT_READERS: readonly Role[] = ['engineer', 'checker', 'approver', 'administrator'];

/** Roles that write drafts and design bases. */
export const DRAFT_WRITERS: readonly Role[] = ['engineer'];

export const ROLE_LABELS: Record<Role, string> = {
  engineer: 'Engineer',
  checker: 'Checker',
  approver: 'Approver',
  procurement: 'Procurement',
  reader: 'Reader',
  administrator: 'Administrator',
};

/** Check category: 1 self, 2 independent, 3 outside. */
export const CHECK_CATEGORIES = [1, 2, 3] as const;
