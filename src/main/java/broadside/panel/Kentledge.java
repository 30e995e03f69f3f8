package broadside.panel;

import broadside.quantity.Length;
import broadside.quantity.Mass;
import java.util.Optional;

/**
 * Ballast of a hoarding on raking braces, as typed: one brace at each post.
 *
 * @param mass       on the foot of each brace
 * @param lever      from the face to the middle of that ballast
 * @param frontMass  on the foot below the face, at each post
 * @param faceMass   of boards, post and brace that go with one post
 */
public record Kentledge(Optional<Mass> mass, Optional<Length> lever, Optional<Mass> frontMass, Optional<Mass> faceMass, FenceFeet.Surface surface) { }
