import { Injectable } from '@nestjs/common';
import type { OnModuleInit } from '@nestjs/common';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import { listRoutes } from './route-list';

/** Stops the boot when a handler carries no access decision: forgetting one must never mean "open". */
@Injectable()
export class AccessCheck implements OnModuleInit {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
  ) {}

  onModuleInit(): void {
    const undecided = listRoutes(this.discovery, this.scanner).filter((route) => !route.access);
    if (undecided.length === 0) return;
    throw new Error(
      `No access decision on ${undecided.map((route) => route.handler).join(', ')}: ` +
        'give each handler @Public, @SignedIn or @Can.',
    );
  }
}
