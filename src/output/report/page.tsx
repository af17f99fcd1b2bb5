import type { ComponentChildren } from 'preact';
import { styles } from './styles.js';

/** Nothing may be fetched, run or sent: the page holds all that it shows. */
const CONTENT_POLICY = "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'";

export interface Chapter {
  readonly id: string;
  readonly title: string;
  readonly body: ComponentChildren;
  /** Begins on a new sheet of paper. */
  readonly sheet?: boolean;
}

interface PageProps {
  readonly title: string;
  readonly lead: string;
  readonly chapters: readonly Chapter[];
}

export function Page({ title, lead, chapters }: PageProps) {
  return (
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta http-equiv="Content-Security-Policy" content={CONTENT_POLICY} />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <meta name="generator" content="Synodos" />
        <title>{title}</title>
        {/* The style sheet is our own text; a browser reads it raw, so it is not escaped. */}
        <style dangerouslySetInnerHTML={{ __html: styles }} />
      </head>
      <body>
        <a class="skip" href="#content">
          To the content
        </a>
        <header>
          <h1>{title}</h1>
          <p class="lead">{lead}</p>
          <nav aria-label="Chapters">
            <ul>
              {chapters.map(({ id, title: name }) => (
                <li key={id}>
                  <a href={`#${id}`}>{name}</a>
                </li>
              ))}
            </ul>
          </nav>
        </header>
        <main id="content">
          {chapters.map(({ id, title: name, body, sheet }) => (
            <section key={id} aria-labelledby={id}>
              <h2 id={id} class={sheet === true ? 'sheet' : undefined}>
                {name}
              </h2>
              {body}
            </section>
          ))}
        </main>
      </body>
    </html>
  );
}
