import { allowedOrigins } from './own-origin.guard';

it('is the public address alone', () => {
  expect([...allowedOrigins(new URL('https://plan.example.test/x'))]).toEqual([
    'https://plan.example.test',
  ]);
});

it('is any name of this machine on the same port, when it runs on it', () => {
  expect([...allowedOrigins(new URL('http://127.0.0.1:4600'))]).toEqual([
    'http://localhost:4600',
    'http://127.0.0.1:4600',
    'http://[::1]:4600',
  ]);
});
