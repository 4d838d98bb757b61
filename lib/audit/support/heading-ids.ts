import type { ActivityList } from '@/lib/schedule/activity-list';
import { memo } from './memo';

/** Headings by ID, where no activity bears it. */
export const headingsById = memo((list: ActivityList) => {
  const byId = new Map<string, number>();
  list.headings.forEach(({ id }, position) => {
    if (id !== '' && !list.indexOf.has(id) && !byId.has(id)) byId.set(id, position);
  });
  return byId;
});
