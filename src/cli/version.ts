/** Program and version, as they stand in signed statements and in every dossier (package.json says the same). */
export const BUILD = 'Gatehold 0.1.0';
