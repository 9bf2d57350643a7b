import type { Response } from 'supertest';
import type TestAgent from 'supertest/lib/agent.js';
import type { Route } from '#server/http/registry.ts';
import type { Expectation } from './access-expectations.ts';
import type { Things } from './access-world.ts';

/** The name of the id that each parameter of an address stands for. */
function idOf(route: Route, parameter: string, things: Things): string {
  if (parameter === 'id') return route.path.startsWith('/sets/') ? things.setId : things.questionId;
  return things[parameter as keyof Things];
}

/** Sends a route's request for these things. */
export async function ask(agent: TestAgent, route: Route, expectation: Expectation, things: Things): Promise<Response> {
  const { path, body } = expectation.request?.(things) ?? {};
  const address = path ?? route.path.replace(/:(\w+)/g, (_whole, parameter: string) => idOf(route, parameter, things));
  const request = agent[route.method](`/api${address}`);
  return body ? request.send(body) : request;
}
