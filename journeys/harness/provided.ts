/** What the global set-up hands to the journeys. */
export interface Demo {
  password: string;
  people: { role: string; name: string; email: string }[];
}

declare module 'vitest' {
  export interface ProvidedContext {
    url: string;
    demo: Demo;
  }
}
