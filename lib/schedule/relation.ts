/** Finish-to-start, start-to-start, finish-to-finish, start-to-finish. */
export const RELATIONS = ['FS', 'SS', 'FF', 'SF'] as const;
export type Relation = (typeof RELATIONS)[number];

export const RELATION_NAMES: Record<Relation, string> = {
  FS: 'finish to start',
  SS: 'start to start',
  FF: 'finish to finish',
  SF: 'start to finish',
};
