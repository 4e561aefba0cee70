#include "cli/output/xml_text.hpp"

#include <string_view>

namespace ringward::cli {
namespace {

constexpr std::string_view kReplacement = "\xEF\xBF\xBD";

unsigned char byte_at(std::string_view text, std::size_t i) {
  return static_cast<unsigned char>(text[i]);
}

bool continues(std::string_view text, std::size_t i) {
  return i < text.size() && (byte_at(text, i) & 0xC0) == 0x80;
}

// Length of a sequence by its first byte; 0 for a byte that begins none.
std::size_t length_of(unsigned char first) {
  if (first < 0x80) return 1;
  if (first >= 0xC2 && first <= 0xDF) return 2;
  if (first >= 0xE0 && first <= 0xEF) return 3;
  if (first >= 0xF0 && first <= 0xF4) return 4;
  return 0;
}

// Longer spellings of smaller numbers, halves of UTF-16 pairs, numbers beyond Unicode, and the two
// that are no characters of XML.
bool is_forbidden(std::string_view sequence) {
  const unsigned char first = byte_at(sequence, 0);
  const unsigned char second = byte_at(sequence, 1);
  if (first == 0xE0) return second < 0xA0;
  if (first == 0xED) return second > 0x9F;
  if (first == 0xF0) return second < 0x90;
  if (first == 0xF4) return second > 0x8F;
  return sequence == "\xEF\xBF\xBE" || sequence == "\xEF\xBF\xBF";
}

// The valid character of more than one byte that begins at `i`; empty when there is none.
std::string_view character_at(std::string_view text, std::size_t i) {
  const std::size_t length = length_of(byte_at(text, i));
  if (length == 0) return {};
  for (std::size_t k = 1; k < length; ++k) {
    if (!continues(text, i + k)) return {};
  }
  const std::string_view sequence = text.substr(i, length);
  return is_forbidden(sequence) ? std::string_view{} : sequence;
}

std::string escaped(char c) {
  switch (c) {
    case '&':
      return "&amp;";
    case '<':
      return "&lt;";
    case '>':
      return "&gt;";
    case '"':
      return "&quot;";
    case '\'':
      return "&#39;";
    default:
      return static_cast<unsigned char>(c) < 0x20 || c == 0x7F ? " " : std::string(1, c);
  }
}

}  // namespace

std::string xml_text(const std::string& text) {
  std::string result;
  for (std::size_t i = 0; i < text.size();) {
    if (byte_at(text, i) < 0x80) {
      result += escaped(text[i++]);
      continue;
    }
    const std::string_view character = character_at(text, i);
    result += character.empty() ? kReplacement : character;
    i += character.empty() ? 1 : character.size();
  }
  return result;
}

std::string shortened(const std::string& text, std::size_t length) {
  std::size_t characters = 0;
  for (std::size_t i = 0; i < text.size(); ++i) {
    if (!continues(text, i) && ++characters > length) return text.substr(0, i) + "...";
  }
  return text;
}

}  // namespace ringward::cli
