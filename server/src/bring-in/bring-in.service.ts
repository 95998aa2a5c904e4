import { Injectable } from '@nestjs/common';
import { type Outcome, problem, type Problem, refused, accepted } from '../common/problem.js';
import { type Viewer } from '../common/viewer.js';
import { type StoredUpload } from '../files/file.entity.js';
import { FilesService } from '../files/files.service.js';
import { estimatesOf } from '../fits/pair-estimates.js';
import { usualRelativeUncertainty } from '../series/measurement-methods.js';
import { DataOrigin, PressureOrigin } from '../series/series.entity.js';
import { type CreateSeriesInput } from '../series/series.input.js';
import { SeriesService } from '../series/series.service.js';
import { type SubstanceRef } from '../substances/substance.input.js';
import { SubstancesService } from '../substances/substances.service.js';
import { ISSUES_SHOWN, pathOf, type ReadAnswer, readAnswer } from './bring-in.answers.js';
import { type KeepRequest, type ReadRequest } from './bring-in.bodies.js';
import type { Expectation } from './doubts/context.js';
import { type ImportProgress, ImportsInProgress, type RunningImport } from './imports.js';
import { recognise } from './recognise.js';
import type { RawTable } from './table.js';
import { TablesService } from './tables.service.js';
import { understand, type Understood } from './understand.js';

/** What was kept. */
export interface Kept {
  seriesId: string;
  pointCount: number;
}

/** Brings tables in: says what is understood of one, and keeps it as a series, whole or not at all. */
@Injectable()
export class BringInService {
  private readonly imports = new ImportsInProgress();

  constructor(
    private readonly tables: TablesService,
    private readonly files: FilesService,
    private readonly substances: SubstancesService,
    private readonly series: SeriesService,
  ) {}

  /** @throws {UnreadableTable} when it is no table */
  async read(request: ReadRequest, viewer: Viewer): Promise<ReadAnswer> {
    const table = await this.tables.read(request, viewer);
    const recognised = request.mapping ? null : recognise(table);
    const expectation = await this.expectation(request);
    const mapping = request.mapping ?? recognise(table).mapping;
    const understood = understand(table, mapping, request.decisions, expectation);
    const usual = usualRelativeUncertainty(request.method);
    return readAnswer({ table, reasons: recognised?.reasons ?? null, understood, expectation, usual });
  }

  /** @throws {UnreadableTable} when it is no table; {ApiError} CONFLICT when cancelled or running already */
  async keep(request: KeepRequest, viewer: Viewer): Promise<Outcome<Kept>> {
    // A repeated request, after a lost answer or a reload, gets the series that is there.
    const earlier = request.importId === undefined ? null : this.progress(request.importId, viewer)?.kept;
    if (earlier) return accepted(earlier);
    const running = this.imports.begin(viewer.id, request.importId);
    try {
      const outcome = await this.import(request, viewer, running);
      running.progress.phase = outcome.ok ? 'DONE' : 'REFUSED';
      if (outcome.ok) running.progress.kept = outcome.value;
      return outcome;
    } finally {
      if (!running.isOver) running.progress.phase = 'REFUSED';
    }
  }

  /** How far one of the viewer's imports is; null when there is none of that id. */
  progress(importId: string, viewer: Viewer): ImportProgress | null {
    return this.imports.find(viewer.id, importId)?.progress ?? null;
  }

  cancel(importId: string, viewer: Viewer): ImportProgress | null {
    const running = this.imports.find(viewer.id, importId);
    running?.cancel();
    return running?.progress ?? null;
  }

  private async import(request: KeepRequest, viewer: Viewer, running: RunningImport): Promise<Outcome<Kept>> {
    const onRows = (rows: number): void => void (running.progress.rows = rows);
    const table = await this.tables.read(request, viewer, { onRows, signal: running.signal });
    onRows(table.rows.length);
    await running.enter('CHECKING');
    const understood = await this.understandForKeeping(table, request);
    if (!understood.isComplete) return refused(...problemsOf(understood));
    await running.enter('STORING');
    const pasted = request.text === undefined ? null : await this.keepText(request.text, viewer);
    const fileId = request.fileId ?? pasted?.id ?? null;
    const created = await this.series.create(seriesInput(request, understood), viewer, fileId);
    if (!created.ok && pasted) await this.files.takeBack(pasted);
    return created.ok ? accepted({ seriesId: created.value.id, pointCount: understood.points.length }) : created;
  }

  private async understandForKeeping(table: RawTable, request: KeepRequest): Promise<Understood> {
    const mapping = request.mapping ?? recognise(table).mapping;
    return understand(table, mapping, request.decisions, await this.expectation(request));
  }

  private keepText(text: string, viewer: Viewer): Promise<StoredUpload> {
    return this.files.keep('pasted table.txt', Buffer.from(text), viewer);
  }

  private async expectation({ a, b, method }: Pick<ReadRequest, 'a' | 'b' | 'method'>): Promise<Expectation> {
    const usual = { usualRelativeUncertainty: usualRelativeUncertainty(method).value };
    const [first, second] = [await this.find(a), await this.find(b)];
    if (!first || !second) return { ...usual, estimate: null, estimateLabel: null };
    const at = estimatesOf(first, second);
    const label = at({ temperature: 298.15, pressure: 101_325 })[0]?.label;
    if (label === undefined) return { ...usual, estimate: null, estimateLabel: null };
    const estimate = (temperature: number, pressure: number): number | null =>
      at({ temperature, pressure }).find((one) => one.label === label)?.diffusivity ?? null;
    return { ...usual, estimate, estimateLabel: label };
  }

  private find(ref: SubstanceRef | null | undefined) {
    return ref ? this.substances.find(ref) : null;
  }
}

/** What has to be mended or decided, at its cell, row or column. */
function problemsOf({ openIssues }: Understood): Problem[] {
  return openIssues
    .slice(0, ISSUES_SHOWN)
    .map((issue) =>
      problem('BAD_INPUT', issue.severity === 'DOUBT' ? `Not decided: ${issue.message}` : issue.message, pathOf(issue)),
    );
}

function seriesInput(
  request: KeepRequest,
  { points, commonRelativeUncertainty, pressureOrigin }: Understood,
): CreateSeriesInput {
  const origin = PressureOrigin[pressureOrigin];
  return {
    a: request.a,
    b: request.b,
    title: request.title,
    source: request.source,
    method: request.method,
    apparatus: request.apparatus ?? null,
    dataOrigin: DataOrigin[request.dataOrigin],
    commonRelativeUncertainty: request.commonRelativeUncertainty ?? commonRelativeUncertainty,
    sameDataAsId: request.sameDataAsId ?? null,
    points: points.map(({ row: _row, ...point }) => ({ ...point, pressureOrigin: origin })),
  };
}
