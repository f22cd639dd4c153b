export type UndefinedReason = 'on a tube' | 'facing straight under a stop';

/**
 * A reading that physics or its own definition leaves without a value: the receiver touches a tube, or a
 * `facing` reading is asked for straight under or over the stop. Nothing else was affected; move the point.
 */
export class UndefinedReadingError extends Error {
  override readonly name = 'UndefinedReadingError';
  constructor(
    readonly reason: UndefinedReason,
    at: readonly [number, number, number],
  ) {
    const where = at.map((metres) => metres.toFixed(3)).join(', ');
    super(
      reason === 'on a tube'
        ? `The point (${where}) touches a tube, where irradiance has no value. Move it off the tube.`
        : `The point (${where}) is straight under or over the stop, so there is no direction to face it. Move it sideways.`,
    );
  }
}
