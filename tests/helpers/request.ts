import { AsyncLocalStorage } from 'node:async_hooks';

export interface TestRequest {
  cookies: Map<string, string>;
  headers: Headers;
}

const store = new AsyncLocalStorage<TestRequest>();

export function newBrowser(address = '127.0.0.9'): TestRequest {
  return {
    cookies: new Map(),
    headers: new Headers({ 'x-forwarded-for': address, 'user-agent': 'test browser', 'x-windrest-path': '/here' }),
  };
}

/** Runs `work` as a request of that browser: doors, actions and routes read its cookies and headers. */
export function inRequest<T>(browser: TestRequest, work: () => Promise<T>): Promise<T> {
  return store.run(browser, work);
}

export function currentRequest(): TestRequest {
  const request = store.getStore();
  if (!request) throw new Error('This test calls a door outside inRequest().');
  return request;
}
