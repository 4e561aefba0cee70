# Writes OUTPUT, a source file that holds the text of INPUT, the list of sources.
file(READ ${INPUT} text)
file(WRITE ${OUTPUT} "#include \"cli/dossier/source_list.hpp\"\n\nnamespace ringward::cli {\n
const std::string& source_list_text() {\n  static const std::string text = R\"sources(${text})sources\";
  return text;\n}\n\n}  // namespace ringward::cli\n")
