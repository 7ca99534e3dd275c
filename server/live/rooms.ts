/** Names of the live rooms. */
export const rooms = {
  line: (meetId: string) => `line:${meetId}`,
  ticket: (tagId: string) => `ticket:${tagId}`,
  check: (benchId: string) => `check:${benchId}`,
  desk: (meetId: string) => `desk:${meetId}`,
  staff: (staffId: string) => `staff:${staffId}`,
};
