import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';

import { FurnaceChart } from '@/components/chart/furnace-chart';
import { drawingOf } from '@/lib/evidence/chart/drawing-of';
import { seenIn } from '@/lib/evidence/chart/judge';
import { recordingOf } from '@/lib/evidence/chart/recording';

import { DIALECTS } from '../../../evidence/charts/dialects';
import { ASKED, runs } from '../../../evidence/charts/stories';

test('a chart says everything without its canvas: in a picture with a name, a table of events, and one of thermocouples', () => {
  const [dialect] = DIALECTS;
  const run = runs(20).find(({ name }) => name === 'overshoot');
  if (!run || !dialect) throw new Error('There is no such run.');
  const markup = renderToStaticMarkup(
    <FurnaceChart drawing={drawingOf(seenIn(recordingOf(dialect.write(run), ASKED), ASKED))} />,
  );
  expect(markup).toMatch(/<svg[^>]*role="img"[^>]*aria-label="Furnace chart of 4 thermocouples/);
  expect(markup).toContain('TC1 stood over 930 °F');
  expect(markup).toContain('Quench in');
  expect(markup).toContain('in the band');
  expect(markup.match(/aria-label="Show event/g)).toHaveLength(2);
});
