import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants';
import { RequestMethod } from '@nestjs/common';
import type { DiscoveryService, MetadataScanner } from '@nestjs/core';
import { ACCESS } from '../decorators/access';
import type { AccessDecision } from '../decorators/access';

export interface RouteEntry {
  method: string;
  /** Below `/api`, e.g. `/jobs/:jobId`. */
  path: string;
  handler: string;
  access: AccessDecision | undefined;
}

/** Every route of the running application, read from Nest itself and not from a list somebody keeps. */
export function listRoutes(discovery: DiscoveryService, scanner: MetadataScanner): RouteEntry[] {
  return discovery.getControllers().flatMap((wrapper) => {
    const controller = wrapper.metatype;
    if (typeof controller !== 'function' || !wrapper.instance) return [];
    const prototype = Object.getPrototypeOf(wrapper.instance) as Record<string, object>;
    return scanner.getAllMethodNames(prototype).flatMap((name) => {
      const handler = prototype[name];
      if (!handler || !Reflect.hasMetadata(METHOD_METADATA, handler)) return [];
      return [
        {
          method: RequestMethod[Reflect.getMetadata(METHOD_METADATA, handler) as number] ?? '?',
          path: joinPath(
            Reflect.getMetadata(PATH_METADATA, controller),
            Reflect.getMetadata(PATH_METADATA, handler),
          ),
          handler: `${controller.name}.${name}`,
          access: Reflect.getMetadata(ACCESS, handler) as AccessDecision | undefined,
        },
      ];
    });
  });
}

function joinPath(...parts: string[]): string {
  const names = parts.flatMap((part) => part.split('/')).filter((name) => name !== '');
  return `/${names.join('/')}`;
}
