/** A few short lines in one cell of a table; a dash where there is none. */
export const Lines = ({ lines }: { lines: readonly string[] }) =>
  lines.length === 0 ? (
    <>–</>
  ) : (
    <ul>
      {lines.map((line, i) => (
        <li key={i}>{line}</li>
      ))}
    </ul>
  );
