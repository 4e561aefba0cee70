# Writes OUTPUT, a source file that holds the text of every .toml file in FOLDER.
file(GLOB files ${FOLDER}/*.toml)
list(SORT files)
set(source "#include \"cli/evidence/case_files.hpp\"\n\nnamespace ringward::cli {\n
const std::vector<CaseFile>& case_files() {\n  static const std::vector<CaseFile> files = {\n")
foreach(file ${files})
  get_filename_component(name ${file} NAME)
  file(READ ${file} text)
  string(APPEND source "{\"${name}\", R\"evidence(${text})evidence\"},\n")
endforeach()
string(APPEND source "  };\n  return files;\n}\n\n}  // namespace ringward::cli\n")
file(WRITE ${OUTPUT} "${source}")
