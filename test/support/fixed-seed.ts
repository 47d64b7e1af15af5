/**
 * The fast tests draw the same random cases every time, so that they say the same on every machine; the
 * slow tests draw new ones. A failure prints seed and path.
 */
import fc from "fast-check";

fc.configureGlobal({ seed: 20_261_201 });
