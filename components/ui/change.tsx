/** A value before and after: the old struck through, the new underlined, an arrow between. */
export function Change({ from, to }: { from: string; to: string }) {
  return (
    <span>
      <span className="sr-only">from </span>
      <del className="was">{from === '' ? '(empty)' : from}</del>
      <span aria-hidden="true"> → </span>
      <span className="sr-only"> to </span>
      <ins className="now no-underline">{to === '' ? '(empty)' : to}</ins>
    </span>
  );
}
