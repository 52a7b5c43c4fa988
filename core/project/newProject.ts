import { PROJECT_FORMAT, PROJECT_VERSION, type Project, type Settings } from './model.ts';

export const DEFAULT_SETTINGS: Settings = {
  practice: 'sans10162',
  memberClass: null,
  ownLimit: null,
  catalogue: 'en',
  units: 'metric',
  sagRatio: 200,
  lengthBasis: 'set-out',
};

/** A project without bays. */
export function newProject(name: string): Project {
  return {
    format: PROJECT_FORMAT,
    version: PROJECT_VERSION,
    name,
    settings: DEFAULT_SETTINGS,
    ownStock: [],
    bays: [],
  };
}
