/** The maker no longer waits for the plan. */
export class PlanCancelledError extends Error {
  constructor() {
    super('The plan was cancelled.');
    this.name = 'PlanCancelledError';
  }
}
