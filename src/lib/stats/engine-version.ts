/** Version of the counting engine: a change in any number of the document changes it. */
export const engineVersion = '0.9.0';
