/** The mark: a stone with a notch and one streak. */
export function Mark() {
  return (
    <svg width="34" height="18" viewBox="0 0 34 18" aria-hidden="true">
      <path
        className="mark-stone"
        d="M1.5 0H21l3 4.5L27 0h5.5A1.5 1.5 0 0 1 34 1.5v15a1.5 1.5 0 0 1-1.5 1.5h-31A1.5 1.5 0 0 1 0 16.5v-15A1.5 1.5 0 0 1 1.5 0Z"
      />
      <path fill="#EDBB47" d="M4 11.4C8 9.3 12 8.3 17 8.3s9 1 13 3.1c-4 1.7-8 2.5-13 2.5s-9-.8-13-2.5Z" />
      <path stroke="#191E21" strokeWidth=".5" d="M8 10.6h13M11 12h15M7 11.6h6" />
    </svg>
  );
}
