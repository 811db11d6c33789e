/** The notch as words use it: solid for the own bid, open for another buyer's. */
export function NotchMark({ isOwn }: { isOwn: boolean }) {
  return (
    <svg className="notch-mark" width="18" height="12" viewBox="0 0 18 12" aria-hidden="true">
      {isOwn ? (
        <>
          <path d="M.5 1h17" stroke="currentColor" strokeWidth="1.5" />
          <path d="M3.2 1h11.6L9 11Z" fill="currentColor" />
        </>
      ) : (
        <path d="M.5 1h3.6L9 9.8 13.9 1h3.6" fill="none" stroke="currentColor" strokeWidth="1.6" />
      )}
    </svg>
  );
}
