/** What the WebAssembly module offers; `kernel.ts` says what each function does to the memory. */
export { renumberColumns, sortColumns } from "./columns";
export { loadLane, subtractFromLanes, sweepLanes, takeLane } from "./four-rows";
export { clearColumns, closeMatrix, findDivisor, pack, placeRow } from "./monomials";
export { addRow, gather, subtractMultiple, sweep } from "./rows";
