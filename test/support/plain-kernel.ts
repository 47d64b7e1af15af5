/** Makes a test file compute with the plain kernel: the suites that run on both are listed in the configuration. */
import { chooseKernel } from "../../src/kernel/thread-workspace.js";

chooseKernel("plain");
