import { afterAll } from "vitest";
import { closeTestDatabase } from "./database";

// One connection pool a test file; the database itself is one a worker.
afterAll(closeTestDatabase);
