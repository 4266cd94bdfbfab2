export const ROLES = ["lead", "examiner", "trainee", "reviewer", "admin"] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_NAMES: Record<Role, string> = {
  lead: "Training lead",
  examiner: "Examiner",
  trainee: "Trainee",
  reviewer: "Reviewer",
  admin: "Administrator",
};

/** Where a person lands after signing in or switching. */
export const LANDING: Record<Role, string> = {
  lead: "/rounds",
  examiner: "/desk",
  trainee: "/desk",
  reviewer: "/drift",
  admin: "/people",
};

/** The people who read blind. A lead knows the references and is never among them. */
export const READING_ROLES = ["examiner", "trainee"] as const;
export type ReadingRole = (typeof READING_ROLES)[number];

export function isRole(value: unknown): value is Role {
  return ROLES.some((role) => role === value);
}
