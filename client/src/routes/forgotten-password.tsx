export const Component = () => null;
