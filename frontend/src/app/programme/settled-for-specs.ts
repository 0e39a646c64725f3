import { TestBed, type ComponentFixture } from '@angular/core/testing';

/** Waits until answers have come and everything that follows from them is worked out, and drawn where something is shown. */
export async function settledForSpecs(fixture?: ComponentFixture<unknown>): Promise<void> {
  for (let turn = 0; turn < 4; turn += 1) {
    await fixture?.whenStable();
    await new Promise((resolve) => setTimeout(resolve));
    TestBed.tick();
  }
}
