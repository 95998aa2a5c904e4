import { Query, Resolver } from '@nestjs/graphql';
import { SignedInMay } from '../common/access.decorators.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { HomeService } from './home.service.js';
import { Home } from './home.types.js';

@Resolver(() => Home)
export class HomeResolver {
  constructor(private readonly homes: HomeService) {}

  @Query(() => Home, { description: 'What waits for the person signed in.' })
  @SignedInMay()
  home(@CurrentViewer() viewer: Viewer): Promise<Home> {
    return this.homes.of(viewer);
  }
}
