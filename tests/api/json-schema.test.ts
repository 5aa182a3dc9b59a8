import { expect, it } from 'vitest';
import { inputFiles, jsonSchema } from '#shared/api/json-schema.ts';
import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { styleKeys } from '#shared/drafts/gown/style-limits.ts';

it('the schema of each input file tells every key and its meaning', () => {
  expect(inputFiles).toEqual(['card', 'style', 'rules']);
  const card = jsonSchema('card');
  expect(card).toMatchObject({ required: [...coreMeasures], additionalProperties: false });
  const text = inputFiles.map((file) => JSON.stringify(jsonSchema(file))).join();
  for (const key of [...coreMeasures, ...furtherMeasures])
    expect(text).toContain(`"${key}":{"type":"number","description":"`);
  for (const key of styleKeys) expect(text).toContain(`"${key.replace('ease.', '')}"`);
});
