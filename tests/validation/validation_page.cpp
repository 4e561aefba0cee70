// Makes docs/validation.md and its pictures, all of them or none:
//   validation_page          runs everything (some minutes)
//   validation_page --check  runs what takes seconds, and compares it with the page that is there

#include <cstring>
#include <fstream>
#include <iostream>
#include <sstream>
#include <stdexcept>
#include <string>
#include <vector>

#include "cli/output/output_files.hpp"
#include "tests/validation/page_part.hpp"

using namespace ringward::testing;

namespace {

const std::string kRoot = RINGWARD_SOURCE_DIR;
const std::string kPage = kRoot + "/docs/validation.md";
const std::string kPictures = kRoot + "/docs/validation/";

std::string text_of(const std::string& path) {
  std::ifstream in(path, std::ios::binary);
  if (!in) throw std::runtime_error("cannot read " + path);
  std::ostringstream text;
  text << in.rdbuf();
  return text.str();
}

using MakePart = PagePart (*)();

PagePart joined(const std::vector<MakePart>& makers) {
  PagePart all;
  for (const MakePart make : makers) {
    PagePart part = make();
    all.texts.merge(part.texts);
    for (PagePicture& picture : part.pictures) all.pictures.push_back(std::move(picture));
    std::cerr << '.' << std::flush;
  }
  std::cerr << '\n';
  return all;
}

const std::vector<MakePart>& quick_parts() {
  static const std::vector<MakePart> parts = {fire_test_part, sensitivity_part, uncertainty_part};
  return parts;
}

std::string page_template() { return text_of(kRoot + "/tests/validation/page_template.md"); }

int make() {
  const std::string text = page_template();
  std::vector<MakePart> makers = quick_parts();
  makers.insert(makers.end(), {variation_part, convergence_part, heat_flow_part});
  const PagePart all = joined(makers);
  std::vector<ringward::cli::OutputFile> files = {{kPage, filled(text, all.texts)}};
  for (const PagePicture& picture : all.pictures) {
    files.push_back({kPictures + picture.file, picture.svg});
  }
  ringward::cli::create_folder(kPictures);
  ringward::cli::write_files(files);
  return 0;
}

int check() {
  const PagePart quick = joined(quick_parts());
  int differences = 0;
  const std::string difference =
      first_difference(text_of(kPage), page_template(), quick.texts, slow_texts());
  if (!difference.empty()) {
    std::cerr << "docs/validation.md is not what the studies give. Not in its place:\n"
              << difference << '\n';
    ++differences;
  }
  for (const PagePicture& picture : quick.pictures) {
    if (text_of(kPictures + picture.file) == picture.svg) continue;
    std::cerr << "docs/validation/" << picture.file << " is not what the studies give\n";
    ++differences;
  }
  if (differences > 0) std::cerr << "make the page anew: bash tests/validation/page.sh\n";
  return differences > 0 ? 1 : 0;
}

}  // namespace

int main(int argc, char** argv) {
  try {
    return argc > 1 && std::strcmp(argv[1], "--check") == 0 ? check() : make();
  } catch (const std::exception& error) {
    std::cerr << "validation_page: " << error.what() << '\n';
    return 1;
  }
}
