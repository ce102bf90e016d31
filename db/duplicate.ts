/** Whether the database refused a row because another has its unique key (1062). */
export const isDuplicate = (thrown: unknown): boolean =>
  typeof thrown === 'object' && thrown !== null && (thrown as { errno?: number }).errno === 1062
