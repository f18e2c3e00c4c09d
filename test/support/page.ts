import "@testing-library/jest-dom/vitest";
import { cleanup, configure } from "@testing-library/react";
import { afterEach, vi } from "vitest";

// Lazy chunks may take seconds on a busy machine: waiting longer changes no verdict.
const patience = { timeout: 20_000 };
configure({ asyncUtilTimeout: patience.timeout });
const waitFor = vi.waitFor.bind(vi);
vi.waitFor = (check, options) => waitFor(check, options ?? patience);
vi.setConfig({ testTimeout: 60_000 });

afterEach(cleanup);
