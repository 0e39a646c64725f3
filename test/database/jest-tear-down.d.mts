/** Stops what jest-set-up started. */
export default function tearDown(): Promise<void>;
