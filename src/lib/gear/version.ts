/**
 * The version of the calculation core. Every outcome carries it, every kept check stores it: whoever changes a
 * figure, a verdict or a limit raises it and adds a line here.
 *
 * 0.1.0  Spur gears: pitch, velocity, Barth's velocity factor, Lewis bending by the handbook table, margin with
 *        its low end, permitted power and torque, verdict, working.
 */
export const CORE_VERSION = '0.1.0';
