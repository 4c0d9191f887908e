#pragma once
// Everything the window can do, in one table: menu, keys and documentation read it.

#include <QAction>
#include <QMap>

#include <array>

namespace quasistat::ui
{

enum class ActionId {
    newDesign,
    open,
    save,
    saveAs,
    closeDesign,
    undo,
    redo,
    placeNext,
    duplicate,
    remove,
    moveLeft,
    moveRight,
    zoomToPath,
    zoomIn,
    zoomOut,
    envelope,
    reportA4,
    reportLetter,
    schemeSystem,
    schemeLight,
    schemeDark,
    quit,
};

struct ActionFacts {
    ActionId id;
    const char *name;  ///< object name: stable, for tests and documentation
    const char *text;  ///< translated in the context "Actions"
    const char *key;   ///< default key; empty: none
    bool needsDesign;  ///< only with a design open
    bool needsSegment; ///< only with a segment selected
};

inline constexpr std::array actionTable{
    ActionFacts{ActionId::newDesign, "new", QT_TRANSLATE_NOOP("Actions", "New"), "Ctrl+N", false, false},
    ActionFacts{ActionId::open, "open", QT_TRANSLATE_NOOP("Actions", "Open…"), "Ctrl+O", false, false},
    ActionFacts{ActionId::save, "save", QT_TRANSLATE_NOOP("Actions", "Save"), "Ctrl+S", true, false},
    ActionFacts{ActionId::saveAs, "saveAs", QT_TRANSLATE_NOOP("Actions", "Save as…"), "Ctrl+Shift+S", true, false},
    ActionFacts{ActionId::closeDesign, "close", QT_TRANSLATE_NOOP("Actions", "Close design"), "Ctrl+W", true, false},
    ActionFacts{ActionId::undo, "undo", QT_TRANSLATE_NOOP("Actions", "Undo"), "Ctrl+Z", true, false},
    ActionFacts{ActionId::redo, "redo", QT_TRANSLATE_NOOP("Actions", "Redo"), "Ctrl+Shift+Z", true, false},
    ActionFacts{ActionId::placeNext, "placeNext", QT_TRANSLATE_NOOP("Actions", "Place next segment"), "Ctrl+I", true,
                false},
    ActionFacts{ActionId::duplicate, "duplicate", QT_TRANSLATE_NOOP("Actions", "Duplicate segment"), "Ctrl+D", true,
                true},
    ActionFacts{ActionId::remove, "delete", QT_TRANSLATE_NOOP("Actions", "Delete segment"), "Del", true, true},
    ActionFacts{ActionId::moveLeft, "moveLeft", QT_TRANSLATE_NOOP("Actions", "Move segment left"), "Alt+Left", true,
                true},
    ActionFacts{ActionId::moveRight, "moveRight", QT_TRANSLATE_NOOP("Actions", "Move segment right"), "Alt+Right", true,
                true},
    ActionFacts{ActionId::zoomToPath, "zoomToPath", QT_TRANSLATE_NOOP("Actions", "Zoom to path"), "Ctrl+0", true,
                false},
    ActionFacts{ActionId::zoomIn, "zoomIn", QT_TRANSLATE_NOOP("Actions", "Zoom in"), "Ctrl++", true, false},
    ActionFacts{ActionId::zoomOut, "zoomOut", QT_TRANSLATE_NOOP("Actions", "Zoom out"), "Ctrl+-", true, false},
    ActionFacts{ActionId::envelope, "envelope", QT_TRANSLATE_NOOP("Actions", "Envelope"), "Ctrl+E", true, false},
    ActionFacts{ActionId::reportA4, "reportA4", QT_TRANSLATE_NOOP("Actions", "Report, A4…"), "Ctrl+R", true, false},
    ActionFacts{ActionId::reportLetter, "reportLetter", QT_TRANSLATE_NOOP("Actions", "Report, Letter…"), "Ctrl+Shift+R",
                true, false},
    ActionFacts{ActionId::schemeSystem, "schemeSystem", QT_TRANSLATE_NOOP("Actions", "Light or dark as the system"), "",
                false, false},
    ActionFacts{ActionId::schemeLight, "schemeLight", QT_TRANSLATE_NOOP("Actions", "Light"), "", false, false},
    ActionFacts{ActionId::schemeDark, "schemeDark", QT_TRANSLATE_NOOP("Actions", "Dark"), "", false, false},
    ActionFacts{ActionId::quit, "quit", QT_TRANSLATE_NOOP("Actions", "Quit"), "Ctrl+Q", false, false},
};

/// One QAction for each entry of the table, with its text and key, children of `owner`.
[[nodiscard]] QMap<ActionId, QAction *> createActions(QObject *owner);

} // namespace quasistat::ui
