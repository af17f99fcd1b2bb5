import type { ComponentChildren } from 'preact';

/** The column of the page, px. Pictures are drawn at this size and scroll sideways on a narrower screen. */
export const COLUMN_WIDTH = 704;
/** What stays in place at the left while a wide picture scrolls: names, scales. */
export const GUTTER_WIDTH = 76;
export const PLOT_WIDTH = COLUMN_WIDTH - GUTTER_WIDTH;

export interface FigureProps {
  /** Unique on the page; the picture's title and description take their ids from it. */
  readonly id: string;
  /** The finding, as a heading. */
  readonly title: string;
  /** The finding in a sentence, for those who hear the picture. */
  readonly finding: string;
  readonly width: number;
  readonly height: number;
  /** The id of the table that holds the picture's numbers. */
  readonly tableId: string;
  readonly children: ComponentChildren;
  /** Drawn beside the picture, `GUTTER_WIDTH` wide and as high. */
  readonly gutter?: ComponentChildren;
  readonly legend?: ComponentChildren;
}

/** A picture with its finding as title, a description for screen readers, and the way to its numbers. */
export function Figure(props: FigureProps) {
  const { id, title, finding, width, height, tableId, children, gutter, legend } = props;
  return (
    <figure class="picture" aria-labelledby={`${id}-caption`}>
      <figcaption id={`${id}-caption`}>{title}</figcaption>
      <div class="frame">
        {gutter === undefined ? null : (
          <svg class="gutter" width={GUTTER_WIDTH} height={height} aria-hidden="true">
            {gutter}
          </svg>
        )}
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
      </div>
      {legend}
      <p class="note to-numbers">
        <a href={`#${tableId}`} aria-label={`The numbers of the picture: ${title}`}>
          The numbers
        </a>
      </p>
    </figure>
  );
}
