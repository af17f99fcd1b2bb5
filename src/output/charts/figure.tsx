import type { ComponentChildren } from 'preact';

/** The column of the page, px: pictures are drawn at this size and scroll sideways on a narrower screen. */
export const COLUMN_WIDTH = 704;

export interface FigureProps {
  /** Unique on the page; the picture's title and description take their ids from it. */
  readonly id: string;
  /** The finding, as a heading. */
  readonly title: string;
  /** The finding in a sentence, for those who hear the picture. */
  readonly finding: string;
  readonly width?: number;
  readonly height: number;
  /** The id of the table that holds the picture's numbers. */
  readonly tableId: string;
  readonly children: ComponentChildren;
  readonly legend?: ComponentChildren;
}

/** A picture with its finding as title, a description for screen readers, and the way to its numbers. */
export function Figure({
  id,
  title,
  finding,
  width = COLUMN_WIDTH,
  height,
  tableId,
  children,
  legend,
}: FigureProps) {
  return (
    <figure class="picture" aria-labelledby={`${id}-caption`}>
      <figcaption id={`${id}-caption`}>{title}</figcaption>
      <div class="scroll" tabIndex={0} role="group" aria-label={`Picture: ${title}`}>
        <svg
          width={width}
          height={height}
          viewBox={`0 0 ${width} ${height}`}
          role="img"
          aria-labelledby={`${id}-title ${id}-desc`}
        >
          <title id={`${id}-title`}>{title}</title>
          <desc id={`${id}-desc`}>{finding}</desc>
          {children}
        </svg>
      </div>
      <p class="note">
        {legend}
        {legend === undefined ? null : ' '}
        <a href={`#${tableId}`}>The numbers</a>
      </p>
    </figure>
  );
}
