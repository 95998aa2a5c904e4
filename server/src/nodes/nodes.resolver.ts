import { Args, ID, Query, Resolver } from '@nestjs/graphql';
import { AnyoneMay } from '../common/access.decorators.js';
import { Node } from '../common/graphql/node.js';
import { CurrentViewer, type Viewer } from '../common/viewer.js';
import { NodesService } from './nodes.service.js';

@Resolver()
export class NodesResolver {
  constructor(private readonly nodes: NodesService) {}

  @Query(() => Node, { nullable: true })
  @AnyoneMay()
  node(@Args('id', { type: () => ID }) id: string, @CurrentViewer() viewer: Viewer | null): Promise<Node | null> {
    return this.nodes.find(id, viewer);
  }
}
