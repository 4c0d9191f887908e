#pragma once
// The same gas in another model: what makes sense there is kept, nothing typed is lost.

#include "core/document/design.h"
#include "ui/session/session.h"

#include <map>
#include <string>

namespace quasistat::ui
{

/// The `gas` object of the document for `model`, made from the one of `snapshot`. Composition and fluid turn into each
/// other, air stays air, a mixture that a model of one gas cannot take stays as the text of its fluid; a perfect gas
/// takes γ (at the start's temperature) and the molar mass of what was there.
[[nodiscard]] document::Json gasInModel(const Snapshot &snapshot, const std::string &model,
                                        const gas::Library &library);

/// Remembers each model's gas as it was left, so that going there and back changes nothing.
class ModelSwitch
{
public:
    /// The design with its gas in `model`.
    [[nodiscard]] document::Design switched(const Snapshot &snapshot, const std::string &model,
                                            const gas::Library &library);

private:
    std::map<std::string, Snapshot> m_left; ///< by model
};

/// What the chosen model cannot take of this gas, as a sentence; empty if it takes everything.
[[nodiscard]] QString lackingWords(const document::Design &design, const gas::Library &library);

} // namespace quasistat::ui
