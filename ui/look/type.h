#pragma once
// The faces and sizes of type: few, and the same everywhere.

#include <QFont>
#include <QStringList>

namespace quasistat::ui
{

/// The platform's interface face; where the platform names only a generic one: Inter, then DejaVu Sans. The first that
/// is installed is used. Needs a QGuiApplication.
[[nodiscard]] QStringList interfaceFamilies();

/// The interface face at `pixels`, a device-independent size.
[[nodiscard]] QFont face(double pixels, QFont::Weight weight = QFont::Normal);

/// The face for paper and files: the interface face if its digits are of one width, else Open Sans or DejaVu Sans. Digits in
/// cells would tear figures apart for whoever searches or copies the text.
[[nodiscard]] QFont printFace(double pixels, QFont::Weight weight = QFont::Normal);

[[nodiscard]] QFont headingFace(); ///< 16/600, the ledger's heading
[[nodiscard]] QFont titleFace();   ///< 14/600, sections and header values
[[nodiscard]] QFont bodyFace();    ///< 13, body and figures
[[nodiscard]] QFont labelFace();   ///< 12, labels, ticks, second lines
[[nodiscard]] QFont captionFace(); ///< 11, header captions

} // namespace quasistat::ui
