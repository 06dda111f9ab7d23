import { createContext, useContext } from 'react';
import type { StoredEdgePreset } from '#shared/contracts/edge-presets.ts';

const savedEdgesContext = createContext<readonly StoredEdgePreset[]>([]);

/** Edges that the shop saved, in either unit. */
export const SavedEdgesProvider = savedEdgesContext.Provider;

export const useSavedEdges = (): readonly StoredEdgePreset[] => useContext(savedEdgesContext);
