import { Module } from '@nestjs/common';
import { FitsModule } from '../fits/fits.module.js';
import { PairsModule } from '../pairs/pairs.module.js';
import { PeopleModule } from '../people/people.module.js';
import { DataSheetVersionsResolver, VersionEventsResolver } from './data-sheet-versions.resolver.js';
import { DataSheetsResolver, PairSheetResolver } from './data-sheets.resolver.js';
import { DataSheetsService } from './data-sheets.service.js';
import { DraftingService } from './drafting.service.js';

@Module({
  imports: [FitsModule, PairsModule, PeopleModule],
  providers: [
    DataSheetsService,
    DraftingService,
    DataSheetsResolver,
    DataSheetVersionsResolver,
    VersionEventsResolver,
    PairSheetResolver,
  ],
  exports: [DataSheetsService, DraftingService],
})
export class DataSheetsModule {}
