import { Args, Context, ID, Mutation, Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { RolesMay } from '../common/access.decorators.js';
import { loaderFor } from '../common/graphql/loader-for.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { DataSheetVersion } from '../data-sheets/data-sheet-version.entity.js';
import { DataSheetVersionPayload, toVersionPayload } from '../data-sheets/data-sheets.resolver.js';
import { PeopleService } from '../people/people.service.js';
import { Person } from '../people/person.entity.js';
import { SheetContent } from '../sheet-documents/sheet-content.types.js';
import { type Release } from './release.entity.js';
import { ReleasesService } from './releases.service.js';
import { VersionContentService } from './version-content.service.js';

@Resolver(() => DataSheetVersion)
export class ReleasesResolver {
  constructor(
    private readonly releases: ReleasesService,
    private readonly contents: VersionContentService,
    private readonly people: PeopleService,
  ) {}

  @Mutation(() => DataSheetVersionPayload, {
    description: 'An editor who did not prepare the version (the reviewer may), with the password again.',
  })
  @RolesMay('EDITOR')
  async releaseDataSheet(
    @Args('versionId', { type: () => ID }) versionId: string,
    @Args('password') password: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.releases.release(versionId, password, viewer));
  }

  @Mutation(() => DataSheetVersionPayload)
  @RolesMay('EDITOR')
  async withdrawDataSheet(
    @Args('versionId', { type: () => ID }) versionId: string,
    @Args('reason') reason: string,
    @Args('password') password: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<DataSheetVersionPayload> {
    return toVersionPayload(await this.releases.withdraw(versionId, reason, password, viewer));
  }

  @ResolveField(() => SheetContent, { description: 'All that the sheet says, as its page and its PDF show it.' })
  content(@Parent() version: DataSheetVersion): Promise<SheetContent> {
    return this.contents.contentOf(version);
  }

  @ResolveField(() => Person, { nullable: true })
  async releasedBy(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Person | null> {
    const release = await this.releaseOf(version, context);
    return release && loaderFor(context, this.people.byIds).load(release.releasedById);
  }

  @ResolveField(() => Date, { nullable: true })
  async releasedAt(@Parent() version: DataSheetVersion, @Context() context: object): Promise<Date | null> {
    return (await this.releaseOf(version, context))?.releasedAt ?? null;
  }

  @ResolveField(() => String, {
    nullable: true,
    description: 'Lower-case hex SHA-256 of the canonical JSON snapshot; null until released.',
  })
  async contentHash(@Parent() version: DataSheetVersion, @Context() context: object): Promise<string | null> {
    return (await this.releaseOf(version, context))?.contentHash ?? null;
  }

  @ResolveField(() => String, {
    nullable: true,
    description: 'Hash of the release before this one, in the whole service; null for the first.',
  })
  async previousHash(@Parent() version: DataSheetVersion, @Context() context: object): Promise<string | null> {
    return (await this.releaseOf(version, context))?.previousHash ?? null;
  }

  @ResolveField(() => String, { nullable: true })
  async doi(@Parent() version: DataSheetVersion, @Context() context: object): Promise<string | null> {
    return (await this.releaseOf(version, context))?.doi ?? null;
  }

  private releaseOf(version: DataSheetVersion, context: object): Promise<Release | null> {
    return loaderFor(context, this.releases.byVersions).load(version.id);
  }
}
