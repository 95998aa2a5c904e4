import { Module } from '@nestjs/common';
import { DataSheetsModule } from '../data-sheets/data-sheets.module.js';
import { FitsModule } from '../fits/fits.module.js';
import { PairsModule } from '../pairs/pairs.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SeriesModule } from '../series/series.module.js';
import { SubstancesModule } from '../substances/substances.module.js';
import { NodesResolver } from './nodes.resolver.js';
import { NodesService } from './nodes.service.js';

@Module({
  imports: [DataSheetsModule, FitsModule, PairsModule, PeopleModule, SeriesModule, SubstancesModule],
  providers: [NodesService, NodesResolver],
})
export class NodesModule {}
