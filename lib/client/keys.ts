/** Keys of the query cache: whatever stands under a longer key is thrown out with the shorter one. */
export const keys = {
  me: ['me'] as const,
  office: (office: string) => ['office', office] as const,
  rules: (office: string) => ['office', office, 'rules'] as const,
  contractors: (office: string) => ['office', office, 'contractors'] as const,
  members: (office: string) => ['office', office, 'members'] as const,
  projects: (office: string) => ['office', office, 'projects'] as const,
  project: (office: string, project: string) => ['office', office, 'projects', project] as const,
  revisions: (office: string, project: string) =>
    ['office', office, 'projects', project, 'revisions'] as const,
  submission: (office: string, submission: string) => ['office', office, 'submissions', submission] as const,
  /** `part`: findings, activities, analysis, chance, comments, record … with what selects it. */
  submissionPart: (office: string, submission: string, part: string, ...by: readonly unknown[]) =>
    ['office', office, 'submissions', submission, part, ...by] as const,
};
