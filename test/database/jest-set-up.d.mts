/** Starts the throw-away MariaDB of a test run and names it in TEST_DATABASE_SERVER. */
export default function setUp(): Promise<void>;
