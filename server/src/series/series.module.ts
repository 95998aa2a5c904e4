import { Module } from '@nestjs/common';
import { FilesModule } from '../files/files.module.js';
import { MailModule } from '../mail/mail.module.js';
import { PairsModule } from '../pairs/pairs.module.js';
import { PeopleModule } from '../people/people.module.js';
import { SeriesPointsStore } from './series-points.store.js';
import { PairSeriesResolver, SeriesEventsResolver, SeriesResolver } from './series.resolver.js';
import { SeriesService } from './series.service.js';

@Module({
  imports: [FilesModule, MailModule, PairsModule, PeopleModule],
  providers: [SeriesService, SeriesPointsStore, SeriesResolver, SeriesEventsResolver, PairSeriesResolver],
  exports: [SeriesService, SeriesPointsStore],
})
export class SeriesModule {}
