import type { Endpoint } from '#shared/actor/endpoint';

/** Every endpoint of the application, in the order of the features. */
export const endpoints: readonly Endpoint[] = [];
