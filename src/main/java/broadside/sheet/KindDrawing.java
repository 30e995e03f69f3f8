package broadside.sheet;

import broadside.assess.Loads;
import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import java.util.Optional;

/** The drawing of each kind. */
final class KindDrawing implements Item.Kinds<Drawing> {

    private final Optional<Loads> loads;
    private final Format format;

    KindDrawing(Optional<Loads> loads, Format format) {
        this.loads = loads;
        this.format = format;
    }

    @Override
    public Drawing postSign(PostSign sign) {
        return new SignDrawing(sign, loads, format).make();
    }

    @Override
    public Drawing hoarding(Hoarding hoarding) {
        return new HoardingDrawing(hoarding, loads, format).make();
    }

    @Override
    public Drawing bannerFence(BannerFence fence) {
        return new FenceDrawing(fence, loads, format).make();
    }

    @Override
    public Drawing facadePanel(FacadePanel facade) {
        return new FacadeDrawing(facade, loads, format).make();
    }

    @Override
    public Drawing projectingSign(ProjectingSign sign) {
        return new BladeDrawing(sign, loads, format).make();
    }

    @Override
    public Drawing spannedBanner(SpannedBanner banner) {
        return new BannerDrawing(banner, loads, format).make();
    }
}
