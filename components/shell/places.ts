/** The places of an office, as its rail shows them. */
export const PLACES = [
  { segment: null, label: 'Desk', permission: 'office:read' },
  { segment: 'projects', label: 'Projects', permission: 'projects:read' },
  { segment: 'contractors', label: 'Contractors', permission: 'contractors:read' },
  { segment: 'people', label: 'People', permission: 'members:read' },
  { segment: 'rules', label: 'Rules', permission: 'rules:read' },
] as const;
