/** Reads until it is as it should be, half a minute at most; what it came to then is what is judged. */
async function inTime<T>(read: () => Promise<T>, wanted: T): Promise<T> {
  for (let tries = 0; tries < 150; tries++) {
    const present = await read();
    if (JSON.stringify(present) === JSON.stringify(wanted)) return present;
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  return read();
}

/** Expects it by then: what was typed last may still be on its way while “kept” speaks of what was typed before. */
export async function expectInTime<T>(read: () => Promise<T>, wanted: T): Promise<void> {
  expect(await inTime(read, wanted)).toEqual(wanted);
}
