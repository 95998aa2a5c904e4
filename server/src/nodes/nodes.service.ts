import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { isId, type Node } from '../common/graphql/node.js';
import { isOfTheGroup, type Viewer } from '../common/viewer.js';
import { DataSheet } from '../data-sheets/data-sheet.entity.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { DataSheetsService } from '../data-sheets/data-sheets.service.js';
import { FitsService } from '../fits/fits.service.js';
import { GasPair } from '../pairs/gas-pair.entity.js';
import { Person } from '../people/person.entity.js';
import { SeriesService } from '../series/series.service.js';
import { Substance } from '../substances/substance.entity.js';

const TABLES = {
  Person: 'people',
  Substance: 'substances',
  GasPair: 'gas_pairs',
  Series: 'series',
  Fit: 'fits',
  DataSheet: 'data_sheets',
  DataSheetVersion: 'data_sheet_versions',
} as const;
type NodeType = keyof typeof TABLES;

/** Ids are unique over all tables, so one question to the database tells what an id names. */
const WHERE_IS_IT = Object.entries(TABLES)
  .map(([type, table]) => `SELECT '${type}' AS type FROM ${table} WHERE id = $1`)
  .join(' UNION ALL ');

@Injectable()
export class NodesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly series: SeriesService,
    private readonly fits: FitsService,
    private readonly sheets: DataSheetsService,
  ) {}

  /** What `id` names, or null when there is nothing the viewer may see. */
  async find(id: string, viewer: Viewer | null): Promise<Node | null> {
    if (!isId(id)) return null;
    const [row]: { type: NodeType }[] = await this.dataSource.query(WHERE_IS_IT, [id]);
    return row ? this.load(row.type, id, viewer) : null;
  }

  private async load(type: NodeType, id: string, viewer: Viewer | null): Promise<Node | null> {
    const { manager } = this.dataSource;
    switch (type) {
      case 'Person':
        return viewer && (isOfTheGroup(viewer) || viewer.id === id) ? manager.findOneBy(Person, { id }) : null;
      case 'Substance':
        return manager.findOneBy(Substance, { id });
      case 'GasPair':
        return manager.findOneBy(GasPair, { id });
      case 'Series':
        return this.series.find(id, viewer);
      case 'Fit':
        return this.fits.find(id, viewer);
      case 'DataSheet': {
        const sheet = await manager.findOneByOrFail(DataSheet, { id });
        return this.sheets.findByCode(sheet.code, viewer);
      }
      case 'DataSheetVersion': {
        const version = await manager.findOneByOrFail(DataSheetVersion, { id });
        return this.sheets.visible([version], viewer)[0] ?? null;
      }
    }
  }
}
