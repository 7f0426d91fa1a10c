import { expect, test } from 'vitest';
import { listed } from '../../../core/standards/listed.ts';
import { rulesOf } from '../../../web/state/rules.ts';
import { standardFolders } from '../../../web/state/standardFolders.ts';

test('the bench can fetch the rules of every standard that is listed, or has them at hand', async () => {
  for (const { id } of listed) {
    const rules = standardFolders[id] ? await standardFolders[id]() : rulesOf(id);
    expect(rules).toMatchObject({ id });
  }
});
