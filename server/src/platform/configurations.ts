/** The configurations of folders on disk. */
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { type Configuration, configurationName, type ConfigurationProblem, defaultConfiguration, readConfiguration } from '../service/configuration.ts';

/** The configurations of folders: the nearest file at or above each. Each file is read once; `report` hears of its problems then. */
export class Configurations {
  private readonly folders = new Map<string, Configuration>();

  /** `only` is used everywhere where it is given. */
  constructor(private readonly report: (file: string, problem: ConfigurationProblem) => void, private readonly only?: Configuration) {}

  at(folder: string): Configuration {
    if (this.only) return this.only;
    let known = this.folders.get(folder);
    if (!known) {
      known = this.find(folder);
      this.folders.set(folder, known);
    }
    return known;
  }

  private find(folder: string): Configuration {
    const file = join(folder, configurationName);
    const text = existsSync(file) ? textOf(file) : undefined;
    if (text !== undefined) {
      const { configuration, problems } = readConfiguration(text, file);
      for (const problem of problems) this.report(file, problem);
      return configuration;
    }
    const above = dirname(folder);
    return above === folder ? defaultConfiguration : this.at(above);
  }
}

function textOf(file: string): string | undefined {
  try {
    return readFileSync(file, 'utf8').replace(/^\uFEFF/, '');
  } catch {
    return undefined;
  }
}
