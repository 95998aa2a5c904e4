import { Module } from '@nestjs/common';
import { FilesModule } from '../files/files.module.js';
import { SeriesModule } from '../series/series.module.js';
import { SubstancesModule } from '../substances/substances.module.js';
import { BringInController } from './bring-in.controller.js';
import { BringInService } from './bring-in.service.js';
import { TablesService } from './tables.service.js';

@Module({
  imports: [FilesModule, SeriesModule, SubstancesModule],
  controllers: [BringInController],
  providers: [BringInService, TablesService],
})
export class BringInModule {}
