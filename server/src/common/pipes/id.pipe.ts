import { Injectable } from '@nestjs/common';
import type { PipeTransform } from '@nestjs/common';
import { notFound } from '../api-exception';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

export function isId(value: unknown): value is string {
  return typeof value === 'string' && UUID.test(value);
}

/** An address with something else in an id's place names nothing: the same 404 as an id nobody has. */
@Injectable()
export class IdPipe implements PipeTransform<unknown, string> {
  transform(value: unknown): string {
    if (isId(value)) return value;
    throw notFound();
  }
}
