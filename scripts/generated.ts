/** The files that are made from the sources. Each module of scripts/generate makes some. */
import { existsSync, readFileSync } from 'node:fs';
import { modulesIn } from './modulesIn.ts';
import { root } from './root.mjs';

export interface GeneratedFile {
  /** From the project's folder. */
  readonly path: string;
  readonly text: string;
}

interface Generator {
  readonly files: () => GeneratedFile[] | Promise<GeneratedFile[]>;
}

export async function generatedFiles(): Promise<GeneratedFile[]> {
  const generators = await modulesIn<Generator>(`${root}/scripts/generate`, 'files');
  return (await Promise.all(generators.map(async (generator) => generator.files()))).flat();
}

/** Whether the file holds anything but this text. */
export function isOutOfDate({ path, text }: GeneratedFile): boolean {
  const file = `${root}/${path}`;
  return !existsSync(file) || readFileSync(file, 'utf8') !== text;
}
