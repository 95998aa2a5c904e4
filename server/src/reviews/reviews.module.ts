import { Module } from '@nestjs/common';
import { DataSheetsModule } from '../data-sheets/data-sheets.module.js';
import { FitsModule } from '../fits/fits.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ReviewsResolver, VersionReviewsResolver } from './reviews.resolver.js';
import { ReviewsService } from './reviews.service.js';

@Module({
  imports: [DataSheetsModule, FitsModule, PeopleModule],
  providers: [ReviewsService, ReviewsResolver, VersionReviewsResolver],
  exports: [ReviewsService],
})
export class ReviewsModule {}
