import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { hasRole, type Viewer } from '../common/viewer.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { Series } from '../series/series.entity.js';
import { type Home, type Task, TaskKind } from './home.types.js';

interface OpenItem {
  id: string;
  status: string;
  ownerId: string;
  submittedById: string | null;
  isSeriesOwner: boolean;
  since: Date;
  remark: string | null;
}

const OPEN_SERIES = `
  SELECT s.id, s.status, s.created_by_id AS "ownerId", s.submitted_by_id AS "submittedById", false AS "isSeriesOwner",
         e.at AS since, e.remark
    FROM series s
    JOIN LATERAL (SELECT at, remark FROM series_events WHERE series_id = s.id ORDER BY id DESC LIMIT 1) e ON true
   WHERE s.status IN ('DRAFT', 'SUBMITTED', 'RETURNED') ORDER BY e.at`;

const OPEN_VERSIONS = `
  SELECT v.id, v.status, v.prepared_by_id AS "ownerId", NULL AS "submittedById",
         EXISTS (SELECT FROM fit_series f JOIN series s ON s.id = f.series_id
                  WHERE f.fit_id = v.fit_id AND $1 IN (s.created_by_id, s.submitted_by_id)) AS "isSeriesOwner",
         e.at AS since, e.remark
    FROM data_sheet_versions v
    JOIN LATERAL (SELECT at, remark FROM version_events WHERE version_id = v.id ORDER BY id DESC LIMIT 1) e ON true
   WHERE v.status IN ('DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED') ORDER BY e.at`;

/** What this person is asked to do with the item, or null. */
function seriesTask(item: OpenItem, viewer: Viewer): TaskKind | null {
  if (item.status === 'SUBMITTED')
    return hasRole(viewer, 'EDITOR') && item.submittedById !== viewer.id ? TaskKind.ACCEPT_SERIES : null;
  if (item.ownerId !== viewer.id) return null;
  return item.status === 'RETURNED' ? TaskKind.MEND_SERIES : TaskKind.FINISH_SERIES;
}

function versionTask(item: OpenItem, viewer: Viewer): TaskKind | null {
  if (!hasRole(viewer, 'EDITOR')) return null;
  const isOwn = item.ownerId === viewer.id;
  if (item.status === 'IN_REVIEW') return isOwn || item.isSeriesOwner ? null : TaskKind.REVIEW_VERSION;
  if (item.status === 'APPROVED') return isOwn ? null : TaskKind.RELEASE_VERSION;
  if (!isOwn) return null;
  return item.status === 'RETURNED' ? TaskKind.MEND_VERSION : TaskKind.SUBMIT_VERSION;
}

/** What the owner of an item waits for others to do. */
const WAITING_KIND: Record<string, TaskKind> = {
  SUBMITTED: TaskKind.ACCEPT_SERIES,
  IN_REVIEW: TaskKind.REVIEW_VERSION,
  APPROVED: TaskKind.RELEASE_VERSION,
};

@Injectable()
export class HomeService {
  constructor(private readonly dataSource: DataSource) {}

  async of(viewer: Viewer): Promise<Home> {
    const series: OpenItem[] = await this.dataSource.query(OPEN_SERIES);
    const versions: OpenItem[] = await this.dataSource.query(OPEN_VERSIONS, [viewer.id]);
    const tasks: Task[] = [];
    const waiting: Task[] = [];
    for (const item of series) {
      const kind = seriesTask(item, viewer);
      const row = async (as: TaskKind) => this.seriesRow(item, as);
      if (kind) tasks.push(await row(kind));
      else if (item.ownerId === viewer.id && WAITING_KIND[item.status])
        waiting.push(await row(WAITING_KIND[item.status]!));
    }
    for (const item of versions) {
      const kind = versionTask(item, viewer);
      const row = async (as: TaskKind) => this.versionRow(item, as);
      if (kind) tasks.push(await row(kind));
      else if (item.ownerId === viewer.id && WAITING_KIND[item.status])
        waiting.push(await row(WAITING_KIND[item.status]!));
    }
    return { tasks, waiting };
  }

  private async seriesRow({ id, since, remark }: OpenItem, kind: TaskKind): Promise<Task> {
    return {
      kind,
      since,
      remark,
      series: await this.dataSource.manager.findOneByOrFail(Series, { id }),
      version: null,
    };
  }

  private async versionRow({ id, since, remark }: OpenItem, kind: TaskKind): Promise<Task> {
    return {
      kind,
      since,
      remark,
      series: null,
      version: await this.dataSource.manager.findOneByOrFail(DataSheetVersion, { id }),
    };
  }
}
