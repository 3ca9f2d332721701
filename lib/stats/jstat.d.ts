/** The part of jstat we call; the package carries no types of its own. */
declare module 'jstat' {
  const jStat: {
    studentt: { inv(p: number, df: number): number }
    normal: { inv(p: number, mean: number, sd: number): number }
  }
  export default jStat
}
