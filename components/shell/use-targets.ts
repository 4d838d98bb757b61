'use client';

import { useParams } from 'next/navigation';
import { useProjects } from '@/lib/client/projects';
import { useRules } from '@/lib/client/rules';
import { useActivities } from '@/lib/client/submissions';
import type { Target } from './finder';
import { useMay, useOfficeView } from './office-context';
import { PLACES } from './places';

/** Everything of this office that can be gone to from here; on a submission's pages its activities as well. */
export function useTargets(): { targets: Target[]; pending: boolean } {
  const { slug } = useOfficeView();
  const may = useMay();
  const params = useParams<{ submission?: string }>();
  const submission = params.submission ?? '';
  const projects = useProjects(slug);
  const rules = useRules(slug);
  const activities = useActivities(slug, submission, 'corrected', submission !== '');
  const targets: Target[] = [
    ...PLACES.filter(({ permission }) => may(permission)).map(({ segment, label }): Target => {
      return {
        key: label,
        label,
        code: '',
        kind: 'place',
        href: segment ? `/${slug}/${segment}` : `/${slug}`,
      };
    }),
    ...(projects.data ?? []).map(({ id, name, code }): Target => {
      return { key: id, label: name, code, kind: 'project', href: `/${slug}/projects/${id}` };
    }),
    ...(activities.data ?? []).map(({ id, name, row }): Target => {
      const href = `/${slug}/submissions/${submission}/path?activity=${encodeURIComponent(id)}`;
      return { key: `${id} ${String(row)}`, label: name, code: id, kind: 'activity', href };
    }),
    ...(rules.data ?? []).map(({ id, title }): Target => {
      return { key: id, label: title, code: id, kind: 'rule', href: `/${slug}/rules/${id}` };
    }),
  ];
  return {
    targets,
    pending: projects.isPending || rules.isPending || (submission !== '' && activities.isPending),
  };
}
