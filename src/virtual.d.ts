/** The script of src/lib/charts/reading/first-reading.ts as text (vite.reading.config.ts). */
declare module 'virtual:first-reading' {
  const script: string;
  export default script;
}
