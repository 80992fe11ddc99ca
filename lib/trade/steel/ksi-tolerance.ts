/** Far below the printed step of 1 ksi, far above what converting from MPa leaves. */
export const KSI_TOLERANCE = 1e-6;
