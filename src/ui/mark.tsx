/** The product's sign: a tank with its graduation. */
export function Mark() {
  return (
    <svg width="20" height="26" viewBox="0 0 20 26" aria-hidden="true" className="flex-none">
      <path d="M3 1h14v21a3 3 0 0 1-3 3H6a3 3 0 0 1-3-3z" className="fill-sheet stroke-ink" strokeWidth="1.6" />
      <path d="M4 12q6 2.4 12 0v10a2 2 0 0 1-2 2H6a2 2 0 0 1-2-2z" className="fill-dye" />
      <path d="M13 5h4M14.5 8H17M13 11h4" className="stroke-ink" strokeWidth="1.3" />
    </svg>
  );
}
