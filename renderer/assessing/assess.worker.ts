/** Assesses projects away from the window's own thread. All engineering is core's; this file only passes it plain data. */
import { expose } from 'comlink';
import { unremembered } from '../../core/assess/bayWork.ts';
import { prepared } from '../../core/assess/prepared.ts';
import { assess, assessmentOf } from '../../core/assess.ts';
import { BowingMemory } from '../../core/bowing/memory.ts';
import { stockOf } from '../../core/catalogue/stock.ts';
import { csvFile } from '../../core/documents/csv.ts';
import { reportHtml } from '../../core/documents/report.ts';
import { scheduleCsv } from '../../core/documents/scheduleCsv.ts';
import type { Project } from '../../core/project/model.ts';
import { remediesFor } from '../../core/remedies/remedies.ts';
import { shortlist } from '../../core/shortlist/shortlist.ts';
import { relianceOf } from '../../core/study/reliance.ts';
import { pushOf, studyOf } from '../../core/study/study.ts';
import type { AssessApi } from './assessApi.ts';
import { headOf, partOf, partsOf } from './assessmentParts.ts';
import type { Keeper } from './bowingApi.ts';
import { catalogues } from './catalogues.ts';
import { remembered } from './memory.ts';
import { joinReadings } from './readings.ts';

/** Bays that an edit does not touch keep their critical loads. */
const bowingMemory = new BowingMemory();
const assessFresh = (project: Project) => assess(project, catalogues, 'all levels', bowingMemory);
const preparedOnce = remembered(({ project }) => prepared(project, catalogues), 1);
const assessed = remembered((snapshot) => assessmentOf(preparedOnce(snapshot), 'all levels', bowingMemory));
const keeper: Keeper = {
  remember: (found) => {
    for (const { key, bowings } of found) bowingMemory.remember(key, bowings);
  },
};

const api: AssessApi = {
  assess: (snapshot) => {
    const began = performance.now();
    const assessment = assessed(snapshot);
    return { assessment, took: performance.now() - began };
  },
  unremembered: (snapshot) => unremembered(preparedOnce(snapshot), bowingMemory),
  keep: (port) => expose(keeper, port),
  head: (snapshot) => ({ head: headOf(assessed(snapshot)), parts: partsOf(assessed(snapshot)) }),
  part: (snapshot, k) => partOf(assessed(snapshot), k),
  remedies: (snapshot, id) => {
    const assessment = assessed(snapshot);
    const finding = assessment.findings.find((each) => each.id === id);
    return finding === undefined ? [] : remediesFor(assessment, finding, catalogues, bowingMemory);
  },
  readings: (snapshot, crossing) => joinReadings(assessed(snapshot), crossing, assessFresh),
  shortlist: (snapshot, bars, options) => shortlist(assessed(snapshot), catalogues, bars, options),
  study: (snapshot, bar) => studyOf(assessed(snapshot), bar),
  push: (snapshot, bar, at) => pushOf(assessed(snapshot), bar, at),
  reliance: (snapshot, bay) => relianceOf(assessed(snapshot), bay, catalogues),
  stock: (catalogue, own) => ({
    name: catalogues[catalogue].standard,
    source: catalogues[catalogue].source,
    choices: stockOf(catalogue, own, catalogues).choices.map((angle) => ({
      designation: angle.designation,
      kind: angle.kind,
      own: angle.catalogue === 'own',
      massPerMetre: angle.massPerMetre,
    })),
  }),
  section: (catalogue, own, typed) => {
    const found = stockOf(catalogue, own, catalogues).find(typed);
    return found.ok
      ? { designation: found.angle.designation, nearest: [] }
      : { designation: null, nearest: found.nearest };
  },
  report: (snapshot, { date, fonts }) => {
    const assessment = assessed(snapshot);
    const remedies = new Map(
      assessment.findings.map((finding) => [
        finding.id,
        remediesFor(assessment, finding, catalogues, bowingMemory),
      ]),
    );
    return reportHtml(assessment, { units: snapshot.project.settings.units, date, fonts, remedies });
  },
  scheduleCsv: (snapshot) =>
    csvFile(scheduleCsv(assessed(snapshot).schedule, snapshot.project.settings.units)),
  // As the command line writes it: two spaces of indent, a line feed at the end.
  scheduleJson: (snapshot) => `${JSON.stringify(assessed(snapshot).schedule, null, 2)}\n`,
};

expose(api);
