/** Stands wherever a probability or a decision is shown. */
export function Caution() {
  return (
    <p className="mt-4 max-w-[1200px] text-slate">
      A forecast supports a decision; it does not replace the contract, its notice periods, or the judgement
      of those responsible. Probabilities hold as far as the estimates and the assumed distribution do.
    </p>
  );
}
