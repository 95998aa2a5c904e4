import { Args, ID, Int, Mutation, Query, Resolver } from '@nestjs/graphql';
import { SignedInMay } from '../common/access.decorators.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { ApiKey } from './api-key.js';
import { ApiKeyPayload } from './api-key.payload.js';
import { ApiKeysService } from './api-keys.service.js';

@Resolver()
export class ApiKeysResolver {
  constructor(private readonly apiKeysService: ApiKeysService) {}

  @Query(() => [ApiKey], { description: "The caller's own, the newest first." })
  @SignedInMay()
  apiKeys(@CurrentViewer() viewer: Viewer): Promise<ApiKey[]> {
    return this.apiKeysService.ofPerson(viewer.id);
  }

  @Mutation(() => ApiKeyPayload, { description: 'Needs a session: no key is made with a key.' })
  @SignedInMay()
  async createApiKey(
    @Args('name') name: string,
    @Args('expiresInDays', {
      type: () => Int,
      nullable: true,
      description: 'Without it the key ends only by being revoked.',
    })
    expiresInDays: number | null | undefined,
    @CurrentViewer() viewer: Viewer,
  ): Promise<ApiKeyPayload> {
    const outcome = await this.apiKeysService.create(viewer.id, name, expiresInDays ?? null);
    return outcome.ok ? { ...outcome.value, problems: [] } : { apiKey: null, secret: null, problems: outcome.problems };
  }

  @Mutation(() => ApiKeyPayload, { description: 'Takes effect at once and cannot be undone.' })
  @SignedInMay()
  async revokeApiKey(
    @Args('id', { type: () => ID }) id: string,
    @CurrentViewer() viewer: Viewer,
  ): Promise<ApiKeyPayload> {
    return { apiKey: await this.apiKeysService.revoke(viewer.id, id), secret: null, problems: [] };
  }
}
