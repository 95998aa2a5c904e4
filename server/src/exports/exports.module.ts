import { Module } from '@nestjs/common';
import { DataSheetsModule } from '../data-sheets/data-sheets.module.js';
import { ReleasesModule } from '../releases/releases.module.js';
import { EvaluationController } from './evaluation.controller.js';
import { NotModifiedHook } from './not-modified.hook.js';
import { ReadableVersionsService } from './readable-versions.service.js';
import { ReleaseFilesController } from './release-files.controller.js';
import { SheetFilesController } from './sheet-files.controller.js';
import { SheetFilesService } from './sheet-files.service.js';

@Module({
  imports: [DataSheetsModule, ReleasesModule],
  controllers: [SheetFilesController, ReleaseFilesController, EvaluationController],
  providers: [ReadableVersionsService, SheetFilesService, NotModifiedHook],
})
export class ExportsModule {}
