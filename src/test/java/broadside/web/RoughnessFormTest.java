package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** A code without terrain classes asks for a roughness length in a box of its own. */
class RoughnessFormTest {

    @Test
    void theTerrainIsTyped() {
        String page = Pool.get("/fill?kind=post-sign&code=open-flow/1").body();
        assertThat(Pool.fields(page)).containsKey("site.terrain");
        assertThat(page).contains("a roughness length up to 5 m");
        assertThat(Pool.fields(Pool.get("/fill?kind=post-sign&code=en-1991-1-4/2005").body())).doesNotContainKey("site.terrain");
    }
}
