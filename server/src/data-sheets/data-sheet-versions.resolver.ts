import { Context, Field, ObjectType, Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, isOfTheGroup, type Viewer } from '../common/viewer.js';
import { toCorrelation } from '../fits/correlation-evaluation.js';
import { Correlation } from '../fits/correlation.types.js';
import { Fit } from '../fits/fit.entity.js';
import { FitsService } from '../fits/fits.service.js';
import { PeopleService } from '../people/people.service.js';
import { Person } from '../people/person.entity.js';
import { DataSheet } from './data-sheet.entity.js';
import { DataSheetVersion, VersionEvent } from './data-sheet-version.entity.js';
import { DataSheetsService } from './data-sheets.service.js';
import { correlationOfVersion } from './version-correlation.js';
import { formatNumber } from './version-rules.js';

@ObjectType({ description: 'Words of the editor for one section of the sheet.' })
export class SectionRemark {
  @Field()
  section: string;
  @Field()
  text: string;
}

@Resolver(() => DataSheetVersion)
export class DataSheetVersionsResolver {
  constructor(
    private readonly sheets: DataSheetsService,
    private readonly fits: FitsService,
    private readonly people: PeopleService,
  ) {}

  @ResolveField(() => String, { description: 'edition.revision; the first is 1.0' })
  number(@Parent() version: DataSheetVersion): string {
    return formatNumber(version);
  }

  @ResolveField(() => DataSheet)
  sheet(@Parent() version: DataSheetVersion, @Context() context: object): Promise<DataSheet> {
    return loaderFor(context, this.sheets.byIds).load(version.dataSheetId);
  }

  @ResolveField(() => Fit)
  fit(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Fit> {
    return loaderFor(context, this.fits.byIds).load(version.fitId);
  }

  @ResolveField(() => Correlation)
  async correlation(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Correlation> {
    const fit = await loaderFor(context, this.fits.byIds).load(version.fitId);
    return toCorrelation(correlationOfVersion(fit.result, version.validity));
  }

  @ResolveField(() => [SectionRemark], { description: 'Words of the editor by section.' })
  remarks(@Parent() version: DataSheetVersion): SectionRemark[] {
    return Object.entries(version.remarks).map(([section, text]) => ({ section, text }));
  }

  @ResolveField(() => Person, { nullable: true })
  preparedBy(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Person | null> {
    return loaderFor(context, this.people.byIds).load(version.preparedById);
  }

  @ResolveField(() => DataSheetVersion, { nullable: true })
  async supersededBy(
    @Parent() version: DataSheetVersion,
    @Context() context: object,
  ): Promise<DataSheetVersion | null> {
    return version.supersededById ? loaderFor(context, this.sheets.versionsByIds).load(version.supersededById) : null;
  }

  @ResolveField(() => [VersionEvent], { description: 'Changes of state, oldest first; for members of the group.' })
  async events(
    @Parent() version: DataSheetVersion,
    @Context() context: object,
    @CurrentViewer() viewer: Viewer | null,
  ): Promise<VersionEvent[]> {
    return isOfTheGroup(viewer) ? loaderFor(context, this.sheets.eventsByVersion).load(version.id) : [];
  }
}

@Resolver(() => VersionEvent)
export class VersionEventsResolver {
  constructor(private readonly people: PeopleService) {}

  @ResolveField(() => Person)
  person(@Parent() event: VersionEvent, @Context() context: object): Promise<Person> {
    return loaderFor(context, this.people.byIds).load(event.personId);
  }
}
