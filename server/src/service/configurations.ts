/** The configurations of folders: the nearest file at or above each. */
import type { FileSource } from '../frontends/frontend.ts';
import { join, parent } from '../text/paths.ts';
import { type Configuration, configurationName, type ConfigurationProblem, defaultConfiguration, readConfiguration } from './configuration.ts';

/** Each file is read once until `forget`; `report` hears of its problems then, none of them too. */
export class Configurations {
  private readonly folders = new Map<string, Configuration>();

  /** `only` is used everywhere where it is given. */
  constructor(private readonly source: Pick<FileSource, 'read'>, private readonly report: (file: string, problems: readonly ConfigurationProblem[]) => void, private readonly only?: Configuration) {}

  at(folder: string): Configuration {
    if (this.only) return this.only;
    let known = this.folders.get(folder);
    if (!known) {
      known = this.find(folder);
      this.folders.set(folder, known);
    }
    return known;
  }

  forget(): void {
    this.folders.clear();
  }

  private find(folder: string): Configuration {
    const file = join(folder, configurationName);
    const text = this.source.read(file)?.replace(/^\uFEFF/, '');
    if (text !== undefined) {
      const { configuration, problems } = readConfiguration(text, file);
      this.report(file, problems);
      return configuration;
    }
    const above = parent(folder);
    return above === folder ? defaultConfiguration : this.at(above);
  }
}
