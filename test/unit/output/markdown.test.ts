import { describe, expect, it } from 'vitest';
import { eventsMarkdown, markdownTable, markdownText } from '../../../src/output/index.js';
import { aForecast, aSite, heliocentricEvent, seenFrom, soloEvent } from '../../fixtures/events.js';

describe('Markdown', () => {
  it('keeps pipes, HTML, emphasis and line breaks from meaning anything', () => {
    expect(markdownText('a | b\r\n<script>x</script> & `c` *d* [e](f) \\')).toBe(
      'a \\| b &lt;script&gt;x&lt;/script&gt; &amp; \\`c\\` \\*d\\* \\[e\\](f) \\\\',
    );
  });

  it('writes a header, a rule and a row a line', () => {
    expect(markdownTable(['a', 'b'], [['1', '2|3']])).toBe('| a | b |\n| --- | --- |\n| 1 | 2\\|3 |\n');
  });

  it('tells an event with its zone and how sure it is', () => {
    expect(eventsMarkdown(aForecast([soloEvent({ series: { index: 1, of: 3 } })]), []).split('\n')[2]).toBe(
      '| 2027-02-19 Fri 15:45 UTC | ± 2 min | Mars, opposition, 1 of 3 | Leo, 13.8″, mag −1.2, 0.678 au |',
    );
  });

  it('keeps to the first site’s clocks, for what is not in the sky too', () => {
    const site = aSite({ name: 'Hill | <b>' });
    const lines = eventsMarkdown(aForecast([seenFrom(soloEvent(), site), heliocentricEvent()]), [site]).split(
      '\n',
    );
    expect(lines[0]).toContain('| from Hill \\| &lt;b&gt; |');
    expect(lines[2]).toMatch(/^\| 2027-02-19 Fri 16:45 CET .* Look low in the west-north-west/);
    expect(lines[3]).toMatch(/^\| 2027-02-19 Fri 16:45 CET .* Not in the Earth’s sky\. \|$/);
  });
});
