/** Shown while a place is being fetched. */
export const Opening = () => (
  <p role="status" className="p-6 text-slate">
    Opening…
  </p>
);
