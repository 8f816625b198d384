import { describe, expect, it } from 'vitest';
import { generatedFiles, isOutOfDate } from '../../scripts/generated.ts';

describe('the generated files', async () => {
  const files = await generatedFiles();

  it('are as the sources make them', () => {
    expect(files.length).toBeGreaterThan(0);
    expect(files.filter(isOutOfDate).map(({ path }) => path)).toEqual([]);
  });

  it.each(files)('say in their first lines that they are generated: $path', ({ text }) => {
    expect(text.split('\n').slice(0, 3).join('\n')).toMatch(/generated/i);
  });

  it('are found out of date by a changed letter', () => {
    expect(files.map((file) => isOutOfDate({ ...file, text: `${file.text} ` }))).not.toContain(false);
  });
});
