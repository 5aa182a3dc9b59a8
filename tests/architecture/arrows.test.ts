import { cruise, type ICruiseResult } from 'dependency-cruiser';
import extractConfig from 'dependency-cruiser/config-utl/extract-depcruise-config';
import { existsSync } from 'node:fs';
import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';

async function cruiseHouse(paths: string[], baseDir: string): Promise<ICruiseResult> {
  const config = await extractConfig('./.dependency-cruiser.mjs');
  const { output } = await cruise(paths, {
    ...config.options,
    baseDir,
    ruleSet: { forbidden: config.forbidden ?? [] },
    validate: true,
  });
  if (typeof output === 'string') throw new Error(output);
  return output;
}

const against = (result: ICruiseResult) =>
  result.summary.violations.map((each) => `${each.rule.name}: ${each.from} -> ${each.to}`);

describe('the arrows of the map', () => {
  it('hold for every import in the house', async () => {
    const folders = ['shared', 'server', 'src', 'tests', 'e2e'].filter((each) => existsSync(each));
    const result = await cruiseHouse(folders, process.cwd());
    expect(result.modules.length).toBeGreaterThan(20);
    expect(against(result)).toEqual([]);
  });
});

describe('an import against an arrow is found', () => {
  let house = '';

  afterEach(() => rm(house, { recursive: true, force: true }));

  async function build(files: Record<string, string>): Promise<string[]> {
    house = await mkdtemp(join(tmpdir(), 'arrows-'));
    for (const [path, text] of Object.entries(files)) {
      await mkdir(join(house, dirname(path)), { recursive: true });
      await writeFile(join(house, path), text);
    }
    return against(await cruiseHouse(Object.keys(files), house));
  }

  it('when units lean on geometry, even for a type', async () => {
    const found = await build({
      'shared/units/said.ts':
        "import type { P } from '../geometry/point.ts';\nexport type S = P;\n",
      'shared/geometry/point.ts': 'export type P = number;\n',
    });
    expect(found).toEqual(['shared-units: shared/units/said.ts -> shared/geometry/point.ts']);
  });

  it('when a screen reaches for the server', async () => {
    const found = await build({
      'src/main.ts': "import { app } from '../server/app.ts';\napp();\n",
      'server/app.ts': 'export const app = () => 1;\n',
    });
    expect(found).toEqual(['screens-know-no-server: src/main.ts -> server/app.ts']);
  });

  it('when one feature imports another', async () => {
    const found = await build({
      'src/features/drafting/table.ts': "import { print } from '../print/room.ts';\nprint();\n",
      'src/features/print/room.ts': 'export const print = () => 1;\n',
    });
    expect(found).toEqual([
      'features-stay-apart: src/features/drafting/table.ts -> src/features/print/room.ts',
    ]);
  });

  it('when anything but the two modules for it signs people in by its own means', async () => {
    const oslo = 'export const verify = () => true;\n';
    const found = await build({
      'node_modules/oslo/package.json': '{"name":"oslo","exports":{"./request":"./request.js"}}',
      'node_modules/oslo/request.js': oslo,
      'server/http/session.ts': "import { verify } from 'oslo/request';\nverify();\n",
      'server/app.ts': "import { verify } from 'oslo/request';\nverify();\n",
    });
    expect(found).toEqual(['home-of-oslo: server/app.ts -> node_modules/oslo/request.js']);
  });

  it('when shared code reads the disk', async () => {
    const found = await build({
      'shared/body/card.ts': "import { readFileSync } from 'node:fs';\nreadFileSync('/');\n",
    });
    expect(found).toEqual(['shared-is-pure: shared/body/card.ts -> fs']);
  });
});
