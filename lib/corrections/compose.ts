import type { CellEdit } from '@/lib/schedule/edit';
import { cellAddress } from '@/lib/schedule/cell';
import type { CellContent, Sheet } from '@/lib/schedule/sheet';
import { workOut } from './apply';
import { contentOf } from './content';
import { type Place, type SheetDraft, WorkbookDraft } from './draft';

/** A fix to be adopted. */
export interface Adoptable {
  readonly id: string;
  readonly edits: readonly CellEdit[];
}

export interface Adopted {
  readonly id: string;
  /** With `from` and `to` as the cell stood at that moment. */
  readonly edits: readonly CellEdit[];
}

export interface Skipped {
  readonly id: string;
  /** A plain sentence. */
  readonly reason: string;
}

export interface Adoption {
  readonly adopted: readonly Adopted[];
  readonly skipped: readonly Skipped[];
  /** The sheets with all that was adopted. */
  readonly sheets: Sheet[];
}

/** An edit worked out, waiting for the rest of its fix. */
interface Planned {
  readonly draft: SheetDraft;
  readonly place: Place;
  readonly edit: CellEdit;
}

type Plan = { readonly planned: readonly Planned[] } | { readonly reason: string };

const keyOf = (sheet: string, place: Place) => `${cellAddress(place)} ${sheet}`;

function plan(fix: Adoptable, workbook: WorkbookDraft, changed: ReadonlySet<string>): Plan {
  const pending = new Map<string, CellContent>();
  const planned: Planned[] = [];
  let idle: string | null = null;
  for (const edit of fix.edits) {
    const draft = workbook.sheet(edit.sheet);
    const place = draft?.place(edit.cell);
    if (!draft || !place) return { reason: `There is no cell ${edit.cell} on a sheet “${edit.sheet}”.` };
    const key = keyOf(edit.sheet, place);
    const present = pending.has(key) ? (pending.get(key) ?? null) : contentOf(draft.get(place));
    const { from, to, failure } = workOut(edit, place, present, draft);
    if (failure && edit.items) return { reason: failure };
    if (failure) idle = failure;
    else if (!edit.items && changed.has(key)) {
      return {
        reason: `It would overwrite ${edit.cell}, which another of these corrections has just changed.`,
      };
    } else {
      pending.set(key, to);
      planned.push({ draft, place, edit: { ...edit, cell: cellAddress(place), from, to } });
    }
  }
  return planned.length > 0 ? { planned } : { reason: idle ?? 'It changes no cell.' };
}

/**
 * Adopts several fixes at once, each whole or not at all, in the order given. Those that change entries
 * of one cell are merged; one that would set a cell that another has just changed is skipped.
 * Linear in the number of edits (and in the rows of a column, once each, where a number meets text).
 */
export function composeAdoption(sheets: readonly Sheet[], fixes: readonly Adoptable[]): Adoption {
  const workbook = new WorkbookDraft(sheets);
  const changed = new Set<string>();
  const adopted: Adopted[] = [];
  const skipped: Skipped[] = [];
  for (const fix of fixes) {
    const result = plan(fix, workbook, changed);
    if ('reason' in result) {
      skipped.push({ id: fix.id, reason: result.reason });
      continue;
    }
    for (const { draft, place, edit } of result.planned) {
      draft.set(place, edit.to);
      changed.add(keyOf(edit.sheet, place));
    }
    adopted.push({ id: fix.id, edits: result.planned.map(({ edit }) => edit) });
  }
  return { adopted, skipped, sheets: workbook.finish() };
}
