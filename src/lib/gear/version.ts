/**
 * The version of the calculation core. Every outcome carries it, every kept check stores it: whoever changes a
 * figure, a verdict or a limit raises it and adds a line here.
 *
 * 0.1.0  Spur gears: pitch, velocity, Barth's velocity factor, Lewis bending by the handbook table, margin with
 *        its low end, permitted power and torque, verdict, working.
 * 1.0.0  Helical, internal, rack; every form, angle and shift by geometry beside the handbook; wear by Hertz and
 *        Buckingham; bending of the mate; mesh; comparison with the original; remedies; what limits. The low end of
 *        the margin is taken at the point of steepest fall (was M (1 - 1.645 u)); permitted power is that of the
 *        answer that decides.
 * 1.1.0  Identification: which gear made the readings, with the next reading. The path of contact ends where the line
 *        of action leaves the base circles, and the tips of internal pairs are checked for fouling: mesh figures of
 *        pairs that interfere differ from 1.0.0. Barely undercut teeth get their form factor by geometry (were
 *        refused). Wear of pairs that agree in base pitch alone goes by the pinion's angle and the ratio of teeth.
 * 1.2.0  Identification: the doubt of a helix angle counts, alike in all readings that depend on it. Spans on the
 *        corners of tips are read as what they show, spans in the root with a growing doubt (were the formula's). What
 *        fits no gear is known better: its spans stray together, its depth less, and the old cast cycloidal wheels
 *        are among it by their own height.
 *        Contact is judged between the ends of the flanks: pairs with undercut teeth that lose contact are refused or go
 *        to review. A worn tip gives a tooth no strength and goes to review. The low end is taken at the design point
 *        over the whole accepted range of doubts. Non-metallic teeth end at 3,000 ft/min, and no plant's limit extends
 *        a law.
 *        One dynamic load for a pair: the harsher velocity law of gear and mate counts (was the gear's own), within the
 *        range of both. Teeth of the mate that the method does not cover, interference and teeth that jam go to
 *        review; a jam beyond thinning does not mesh. A spur mate has no helix of its gear; a helical one needs an
 *        angle. Wear that is refused is not asked for again; non-metallic pairs are refused whatever is given. Nothing
 *        is carried by a pair that does not mesh. A wider face is like for like only where it carries, too.
 */
export const CORE_VERSION = '1.2.0';
