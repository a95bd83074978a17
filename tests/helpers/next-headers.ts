import { currentRequest } from './request';

/** Stands in for next/headers in tests. */
export async function cookies() {
  const { cookies: jar } = currentRequest();
  return {
    get: (name: string) => {
      const value = jar.get(name);
      return value === undefined ? undefined : { name, value };
    },
    set: (name: string, value: string) => {
      if (value === '') jar.delete(name);
      else jar.set(name, value);
    },
  };
}

export async function headers() {
  return currentRequest().headers;
}
