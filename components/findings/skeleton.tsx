import { Loading } from '@/components/ui/states';

/** The shape of the page while its findings are on their way. */
export function Skeleton() {
  return (
    <div className="grid gap-5 xl:grid-cols-[minmax(0,1fr)_372px]">
      <Loading label="Fetching the findings" rows={9} />
      <div
        aria-hidden="true"
        className="hidden border border-t-2 border-hair border-t-ink bg-leaf xl:block"
      />
    </div>
  );
}
