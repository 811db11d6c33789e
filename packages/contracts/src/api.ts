import { bidEndpoints } from './bids.ts';
import { dealEndpoints } from './deal-endpoints.ts';
import { deskEndpoints } from './desk.ts';
import { lotEndpoints } from './lot-endpoints.ts';
import { marketEndpoints } from './market.ts';
import { memberEndpoints } from './members.ts';

/** Every route of the API. The server mounts it, the clients are typed by it, OpenAPI and the access matrix test are generated from it. */
export const api = {
  ...memberEndpoints,
  ...marketEndpoints,
  ...lotEndpoints,
  ...bidEndpoints,
  ...dealEndpoints,
  ...deskEndpoints,
};
export type Api = typeof api;
