'use client';

import { X } from 'lucide-react';
import type { News } from '@/lib/client/events';

/** What someone else did meanwhile: a quiet line, read out, that one can put away. */
export function NewsLine({ news }: { news: News | null }) {
  return (
    <div role="status">
      {news && (
        <div className="mb-3 flex items-start gap-3 border border-l-4 border-hair border-l-cord bg-leaf px-3 py-2">
          <p className="min-w-0 flex-1">{news.sentence}</p>
          <button
            type="button"
            aria-label="Put this line away"
            onClick={news.dismiss}
            className="rounded p-1 text-slate hover:bg-tint hover:text-ink"
          >
            <X aria-hidden="true" size={16} />
          </button>
        </div>
      )}
    </div>
  );
}
