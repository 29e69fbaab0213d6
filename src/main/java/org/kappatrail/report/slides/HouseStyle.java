package org.kappatrail.report.slides;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.apache.poi.sl.usermodel.Placeholder;
import org.apache.poi.sl.usermodel.VerticalAlignment;
import org.apache.poi.xslf.usermodel.XMLSlideShow;
import org.apache.poi.xslf.usermodel.XSLFShape;
import org.apache.poi.xslf.usermodel.XSLFSheet;
import org.apache.poi.xslf.usermodel.XSLFSlideLayout;
import org.apache.poi.xslf.usermodel.XSLFSlideMaster;
import org.apache.poi.xslf.usermodel.XSLFTextShape;
import org.kappatrail.report.chart.Palette;
import org.openxmlformats.schemas.drawingml.x2006.main.CTColor;
import org.openxmlformats.schemas.drawingml.x2006.main.CTColorScheme;
import org.openxmlformats.schemas.drawingml.x2006.main.CTFontScheme;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextBody;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextCharacterProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextListStyle;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextParagraphProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.STTextAlignType;
import org.openxmlformats.schemas.presentationml.x2006.main.CTShape;

/** Page, fonts and colours of slides where the site gives no template of its own. */
final class HouseStyle {
  private static final Dimension PAGE = new Dimension(960, 540);
  private static final Rectangle2D TITLE = new Rectangle2D.Double(40, 20, 880, 66);
  private static final Rectangle2D OPENING = new Rectangle2D.Double(40, 150, 880, 100);
  private static final Rectangle2D SUBTITLE = new Rectangle2D.Double(40, 258, 880, 150);
  private static final String FONT = "Arial";
  private static final int TITLE_HUNDREDTHS = 2600;
  private static final int OPENING_HUNDREDTHS = 4000;

  private HouseStyle() {}

  static XMLSlideShow slideShow() {
    XMLSlideShow show = new XMLSlideShow();
    show.setPageSize(PAGE);
    XSLFSlideMaster master = show.getSlideMasters().get(0);
    theme(master);
    place(master);
    for (XSLFSlideLayout layout : master.getSlideLayouts()) {
      place(layout);
    }
    CTTextListStyle title = master.getXmlObject().getTxStyles().getTitleStyle();
    title.getLvl1PPr().setAlgn(STTextAlignType.L);
    title.getLvl1PPr().getDefRPr().setSz(TITLE_HUNDREDTHS);
    title.getLvl1PPr().getDefRPr().setB(true);
    return show;
  }

  private static void place(XSLFSheet sheet) {
    for (XSLFShape shape : List.copyOf(sheet.getShapes())) {
      if (shape instanceof XSLFTextShape text && text.getTextType() != null) {
        Placeholder kind = text.getTextType();
        switch (kind) {
          case TITLE -> text.setAnchor(TITLE);
          case CENTERED_TITLE -> {
            text.setAnchor(OPENING);
            openingSize(text);
          }
          case SUBTITLE -> text.setAnchor(SUBTITLE);
          case SLIDE_NUMBER -> text.setAnchor(new Rectangle2D.Double(840, 508, 80, 22));
          case FOOTER -> text.setAnchor(new Rectangle2D.Double(40, 508, 700, 22));
          case DATETIME -> text.setAnchor(new Rectangle2D.Double(740, 508, 100, 22));
          default -> widen(text);
        }
      }
    }
  }

  private static void openingSize(XSLFTextShape text) {
    CTTextBody body = ((CTShape) text.getXmlObject()).getTxBody();
    CTTextListStyle style = body.isSetLstStyle() ? body.getLstStyle() : body.addNewLstStyle();
    CTTextParagraphProperties level =
        style.isSetLvl1PPr() ? style.getLvl1PPr() : style.addNewLvl1PPr();
    CTTextCharacterProperties run = level.isSetDefRPr() ? level.getDefRPr() : level.addNewDefRPr();
    run.setSz(OPENING_HUNDREDTHS);
    text.setVerticalAlignment(VerticalAlignment.BOTTOM);
  }

  /** The library's own page is narrower. */
  private static void widen(XSLFTextShape text) {
    Rectangle2D old = text.getAnchor();
    double share = PAGE.getWidth() / 720;
    text.setAnchor(
        new Rectangle2D.Double(
            old.getX() * share, old.getY(), old.getWidth() * share, old.getHeight()));
  }

  private static void theme(XSLFSlideMaster master) {
    CTColorScheme colours = master.getTheme().getXmlObject().getThemeElements().getClrScheme();
    set(colours.getDk1(), Palette.INK);
    set(colours.getLt1(), Palette.PAPER);
    set(colours.getDk2(), Palette.QUIET_INK);
    set(colours.getLt2(), Palette.MIXED_WASH);
    set(colours.getAccent1(), Palette.KAPPA);
    set(colours.getAccent2(), Palette.VISCOSITY);
    set(colours.getAccent3(), Palette.TEMPERATURE);
    set(colours.getAccent4(), Palette.WATER);
    set(colours.getAccent5(), Palette.PARTICLES);
    set(colours.getAccent6(), Palette.IRON);
    CTFontScheme fonts = master.getTheme().getXmlObject().getThemeElements().getFontScheme();
    fonts.getMajorFont().getLatin().setTypeface(FONT);
    fonts.getMinorFont().getLatin().setTypeface(FONT);
  }

  private static void set(CTColor place, Color colour) {
    if (place.isSetSysClr()) {
      place.unsetSysClr();
    }
    if (place.isSetSrgbClr()) {
      place.unsetSrgbClr();
    }
    place
        .addNewSrgbClr()
        .setVal(
            new byte[] {(byte) colour.getRed(), (byte) colour.getGreen(), (byte) colour.getBlue()});
  }
}
