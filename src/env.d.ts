/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    /** Of this request, in the log and in the answer's `X-Request-Id`; it says nothing else. */
    requestId: string;
    /** Who is signed in, and where; absent for a visitor. */
    visit?: import('./server/accounts/visit.ts').Visit;
  }
}
