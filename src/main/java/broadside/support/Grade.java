package broadside.support;

import broadside.support.Section.Material;
import broadside.table.Coefficient;
import java.util.Optional;

/**
 * A material grade. Strengths and moduli in Pa, density in kg/m3.
 *
 * @param name      such as "S355", "A53 B", "C24", "Southern Pine No.2", "6082-T6"
 * @param strength  yield strength, characteristic bending strength, reference bending stress or 0.2 % proof strength
 * @param shear     shear strength of timber; none for metals
 * @param modulus   modulus of elasticity for deflections
 */
public record Grade(String name, Material material, Coefficient strength, Optional<Coefficient> shear, Coefficient modulus) { }
