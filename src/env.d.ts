/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    /** Who is signed in, and where; absent for a visitor. */
    visit?: import('./server/accounts/visit.ts').Visit;
  }
}
