package broadside;
import org.junit.jupiter.api.Test;
class SmokeTest { @Test void x() {} }
