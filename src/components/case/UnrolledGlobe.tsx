export const UnrolledGlobe = () => null;
