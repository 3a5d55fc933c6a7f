// The only home of small numbers. Each tolerance has a name, a unit and a reason; how they relate is said here and nowhere else.

/** mm. Two points closer than this are one point: far below any cutter, far above rounding in double precision. */
export const SAME_POINT = 1e-6;

/** mm. Chords may leave an arc by this much where plates are tested against each other; real corners are coarser. */
export const CHORD_FOR_COLLISIONS = 0.15;

/** mm. Chords in the bleed: invisible in print. */
export const CHORD_FOR_AREAS = 0.03;

/** mm. Chords in areas drawn in from the edge (safe, glue): they guide an eye and a glue nozzle, no knife. */
export const CHORD_FOR_INSETS = 0.1;

/** mm. The folded inside may differ from the one asked by this much. */
export const INSIDE_TOLERANCE = 0.05;

/** mm. Depth to which two boards may meet when no contact class names another. */
export const CONTACT_TOLERANCE = 0.05;

/** mm. Glued or touching faces may stand this far from their asked gap. */
export const MATE_TOLERANCE = 0.01;

/** Sine of the angle between faces called parallel. */
export const PARALLEL = 1e-6;

/** mm². Clipped areas below this are rounding, not overlap. */
export const NO_AREA = 1e-4;

/** mm. Shortest line that a cutter is asked for; shorter runs are merged. */
export const SHORTEST_LINE = 1e-4;
