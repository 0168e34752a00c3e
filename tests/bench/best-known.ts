/**
 * Best known objective values of the open instances, from the published tables, from memory; see README
 * of the data. Instances 1 and 2 were solved to the end with CBC 2.10.8, which agrees.
 */
export const bestKnown: ReadonlyMap<number, number> = new Map([
  [1, 607],
  [2, 828],
  [3, 1001],
  [5, 1143],
  [6, 1950],
  [8, 1300],
  [9, 439],
  [10, 4631],
  [12, 4040],
  [14, 1278],
  [15, 3829],
  [17, 5746],
  [19, 3149],
  [20, 4769],
]);
