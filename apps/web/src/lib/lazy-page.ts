import { type ComponentType, type LazyExoticComponent, lazy } from 'react';

/** A page in a chunk of its own, taken from its module by name. */
export function lazyPage(load: () => Promise<ComponentType>): LazyExoticComponent<ComponentType> {
  return lazy(async () => ({ default: await load() }));
}
