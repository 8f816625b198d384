/** Imports every module of a folder, in the order of their names. */
import { readdirSync } from 'node:fs';
import { pathToFileURL } from 'node:url';

/** The caller says, by the type, what each module exports; `member` is checked to be a function. */
export async function modulesIn<Module>(folder: string, member: keyof Module & string): Promise<Module[]> {
  const names = readdirSync(folder).filter((name) => name.endsWith('.ts'));
  return Promise.all(
    names.sort().map(async (name) => {
      const module = (await import(pathToFileURL(`${folder}/${name}`).href)) as Module;
      if (typeof module[member] !== 'function')
        throw new Error(`${folder}/${name} has to export ${member}().`);
      return module;
    }),
  );
}
