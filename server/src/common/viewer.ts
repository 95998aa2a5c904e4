import { createParamDecorator, type ExecutionContext } from '@nestjs/common';

export const ROLES = ['MODELLER', 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR'] as const;
export type RoleName = (typeof ROLES)[number];

/** Who asks. An API key reads what its owner may read and changes nothing. */
export interface Viewer {
  readonly id: string;
  readonly roles: readonly RoleName[];
  readonly viaApiKey: boolean;
}

/** The part of a request (HTTP or GraphQL context) that the access guard fills in. */
export interface RequestWithViewer {
  viewer?: Viewer | null;
}

export function hasRole(viewer: Viewer | null, ...roles: RoleName[]): boolean {
  return viewer !== null && roles.some((role) => viewer.roles.includes(role));
}

/** Members of the group see unreleased work; modellers and visitors see what is released. */
export function isOfTheGroup(viewer: Viewer | null): boolean {
  return hasRole(viewer, 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR');
}

export function viewerOf(context: ExecutionContext): Viewer | null {
  const request =
    context.getType<'http' | 'graphql'>() === 'graphql'
      ? context.getArgByIndex<{ req: RequestWithViewer }>(2).req
      : context.switchToHttp().getRequest<RequestWithViewer>();
  return request.viewer ?? null;
}

/** The person who asks, or null for a visitor. */
export const CurrentViewer = createParamDecorator((_: unknown, context: ExecutionContext) => viewerOf(context));
