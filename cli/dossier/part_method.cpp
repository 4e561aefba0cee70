#include "cli/dossier/dossier_writer.hpp"
#include "cli/output/rate_words.hpp"

namespace ringward::cli {
namespace {

void formula(HtmlPage& page, const std::string& text) {
  page.block(Markup::own("<p class=\"formula\">" + Markup::text(text).html() + "</p>"));
}

void write_heat(DossierWriter& writer) {
  const ColumnInput& input = writer.data.report.input;
  HtmlPage& page = writer.page;
  page.heading(3, "Heat");
  writer.citing_paragraph(
      "The fire \"" + input.curve->name() + "\" [" + input.curve->source() +
      "] heats the exposed surface by convection and radiation [en1991-1-2-2002 3.1]:");
  formula(page, "q = α_c (θ_g − θ_s) + ε σ ((θ_g + 273)⁴ − (θ_s + 273)⁴)");
  writer.citing_paragraph(
      "In the section, with the conductivity, specific heat (moisture included) and "
      "density of concrete after [en1992-1-2-2004 3.3] and of steel after "
      "[en1993-1-2-2005 3.4.1]:");
  formula(page, "ρ c(θ) ∂θ/∂t = div(λ(θ) grad θ)");
  writer.citing_paragraph(
      "It is solved by finite volumes and backward differences with error control "
      "[hindmarsh2005]; grid and time step are the numerical uncertainty stated above.");
}

void write_strength(DossierWriter& writer) {
  HtmlPage& page = writer.page;
  page.heading(3, "Strength");
  writer.citing_paragraph(
      "Concrete in compression [en1992-1-2-2004 3.2.2.1, Table 3.1; above 50 MPa Table "
      "6.1N], to its peak strain and then straight to zero; no tension:");
  formula(page, "σ = 3 ε f_c,θ / ( ε_c1,θ (2 + (ε/ε_c1,θ)³) )");
  writer.citing_paragraph(
      "Bars [en1992-1-2-2004 3.2.3, Table 3.2a], tube and steel shape [en1993-1-2-2005 "
      "3.2.2, Table 3.1]: straight, an ellipse to the yield strength at 2 % strain, "
      "level to 15 %. In cooling, concrete after [en1994-1-2-2005 Annex C]; steel wins "
      "nothing back. Thermal strains [en1992-1-2-2004 3.3.1; en1993-1-2-2005 3.4.1.1].");
}

void write_confinement(DossierWriter& writer) {
  if (!has_confining_tube(writer.data.report)) return;
  HtmlPage& page = writer.page;
  page.heading(3, "Confinement");
  writer.citing_paragraph(
      "A tube that carries no axial load presses on the core with p; the core gains "
      "[richart1928], and the lateral strain that stretches the tube follows from the "
      "axial strain [teng2007]:");
  formula(page,
          "p = 2 t σ_h / D,   f_cc = f_c,θ + 4.1 p ≤ 2.5 f_c,θ,   ε_cc = ε_c1,θ (1 + 5 "
          "(f_cc/f_c,θ − 1))");
  formula(page,
          "ε_hoop = mean thermal strain of the core + mean lateral strain − thermal strain of "
          "the tube − 0.0001");
  writer.citing_paragraph(
      "Hoop stress is limited by friction, which feeds axial stress into the tube from "
      "its cut ends: at mid-height 0.577 of yield where the tube is long enough "
      "(derived, no source). It is zero while the tube stands off the core, and after "
      "its end gaps have closed.");
}

void write_member(DossierWriter& writer) {
  HtmlPage& page = writer.page;
  page.heading(3, "Member and rating");
  writer.citing_paragraph(
      "The section is cut into the cells of the heat flow; plane sections give axial "
      "force and moments. The member is a column of the buckling length between hinges "
      "with an initial bow, second order included:");
  formula(page, "N (e + e_imp + w) = M(N, κ),   w″ = −κ");
  writer.citing_paragraph(
      "It is loaded cold and followed through the fire on the equilibrium that it stands "
      "on. The fire resistance is the first time at which that equilibrium vanishes: "
      "capacity = load. The numerical uncertainty comes from a second calculation on a "
      "coarser grid and is taken off before class and requirement are judged.");
}

}  // namespace

void write_method(DossierWriter& writer) {
  writer.part("Method");
  write_heat(writer);
  write_strength(writer);
  write_confinement(writer);
  write_member(writer);
}

}  // namespace ringward::cli
