import { Module } from '@nestjs/common';
import { PairsModule } from '../pairs/pairs.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SeriesModule } from '../series/series.module.js';
import { SubstancesModule } from '../substances/substances.module.js';
import {
  CorrelationsResolver,
  ExcludedPointsResolver,
  FitsResolver,
  LeftOutSeriesResolver,
  SeriesAnalysesResolver,
  SeriesOffsetsResolver,
} from './fits.resolver.js';
import { FitsService } from './fits.service.js';
import { PairFitsResolver } from './pair-fits.resolver.js';

@Module({
  imports: [PairsModule, PeopleModule, SeriesModule, SubstancesModule],
  providers: [
    FitsService,
    FitsResolver,
    CorrelationsResolver,
    SeriesOffsetsResolver,
    ExcludedPointsResolver,
    LeftOutSeriesResolver,
    SeriesAnalysesResolver,
    PairFitsResolver,
  ],
  exports: [FitsService],
})
export class FitsModule {}
